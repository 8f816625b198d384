import { expect, test } from 'vitest';
import type { Evaluation } from '../../../server/evaluation.ts';
import { renderReport } from '../../../server/render/report.ts';
import { closedVessel } from './fixtures/closedVessel.ts';
import { converter } from './fixtures/converter.ts';
import { HOSTILE, hostile } from './fixtures/hostile.ts';
import { kettle } from './fixtures/kettle.ts';
import { tableOfCases } from './fixtures/tableOfCases.ts';
import { part, words } from './seen.ts';
import { readStrictly } from './wellFormed.ts';

const ALL: readonly (readonly [string, Evaluation])[] = [
  ['kettle', kettle()],
  ['converter', converter()],
  ['closed vessel', closedVessel()],
  ['table of cases', tableOfCases()],
  ['hostile texts', hostile()],
];

test.each(ALL)('%s: the page is well formed, and its links lead to places on it', (_, evaluation) => {
  const { faults, ids, targets, counts } = readStrictly(
    renderReport(evaluation).replace(/<style>[^]*?<\/style>/, ''),
  );
  expect(faults).toEqual([]);
  expect([...targets].filter((target) => !ids.has(target.slice(1)) || !target.startsWith('#'))).toEqual([]);
  expect(counts.get('script')).toBeUndefined();
  expect(counts.get('main')).toBe(1);
  expect(counts.get('h1')).toBe(1);
});

test.each(ALL.slice(0, 4))('%s: nothing is loaded from outside', (_, evaluation) => {
  const page = renderReport(evaluation);
  expect(page).not.toMatch(/https?:|@import|\bsrc=|<link|<script|\bon[a-z]+=/);
  expect(page.match(/url\((?!#)/g)).toBeNull();
});

test.each(ALL)('%s: equal evaluations give equal pages', (_, evaluation) => {
  expect(renderReport(structuredClone(evaluation))).toBe(renderReport(evaluation));
});

test.each(ALL)('%s: every output and every formula is on the page', (_, evaluation) => {
  const page = words(renderReport(evaluation));
  for (const name of Object.keys(evaluation.outputs)) expect(page).toContain(name);
  const shown = Object.values(evaluation.formulas).filter(({ formula }) => page.includes(formula));
  const isTable = Object.keys(evaluation.sheets)[0] === 'Cases';
  // of the three columns of the table of cases the first formula stands for all
  expect(shown.length).toBe(
    isTable ? 3 : Object.keys(evaluation.formulas).length - (page.includes('G4 to G7') ? 3 : 0),
  );
});

test('answers come before steps, steps before checks, and the source sheet last', () => {
  const page = renderReport(kettle());
  const places = ['answers', 'given', 'steps', 'checks', 'limits-of-use', 'versions', 'source'].map((id) =>
    page.indexOf(`<section id="${id}"`),
  );
  expect(places).toEqual([...places].sort((a, b) => a - b));
  expect(places[0]).toBeGreaterThan(0);
});

test('the title block has job, sheet, revision, and lines to sign', () => {
  const block = words(/<header[^]*?<\/header>/.exec(renderReport(kettle()))![0]);
  expect(block).toMatch(
    /Job Ester kettle, trial 7 .*Sheet sample\.yaml .*Revision a3f91c07b2de Prepared name, date Checked name, date/,
  );
});

test('an answer shows its declared digits, unit, and the status that it rests on', () => {
  expect(words(part(renderReport(kettle()), 'answers'))).toContain(
    'E3 step 1.1 extent equilibrium behind it: settled 1.5195 mol',
  );
});

test('what needs attention is told at the head and listed: errors, unsettled solutions, failed checks', () => {
  expect(words(renderReport(kettle()))).toContain('2 of 2 checks passed; nothing needs attention.');
  expect(part(renderReport(kettle()), 'attention')).toBe('');
  const vessel = renderReport(closedVessel());
  expect(words(vessel)).toContain('1 matter needs attention');
  expect(words(part(vessel, 'attention'))).toContain(
    'exhausted: ended before Q reached K (CaCO3(s,calcite) ran out)',
  );
  const failing = renderReport(hostile());
  expect(words(failing)).toContain('2 matters need attention');
  expect(words(part(failing, 'attention'))).toContain('amounts-negative');
});

test('a check says expected, found, within, source, and passed or not in words', () => {
  const checks = words(part(renderReport(converter()), 'checks'));
  expect(checks).toMatch(
    /With pressure 200, the rest the workbook’s own\..*ammonia 15 14\.2 0\.1 Source: a figure remembered from an older sheet not passed/,
  );
  expect(words(part(renderReport(kettle()), 'checks'))).toMatch(/extent 0\.8727 0\.87267 0\.1 % .*passed/);
  expect(words(part(renderReport(kettle()), 'checks'))).toContain('With the workbook’s own values.');
});

test('other values than the workbook has are told under the title block and beside the input', () => {
  const own = kettle();
  expect(words(renderReport(own))).not.toMatch(/other values|the workbook has/);
  const { acid, alcohol } = own.inputs;
  const page = renderReport({ ...own, inputs: { acid: { ...acid!, own: 1.8 }, alcohol: alcohol! } });
  expect(words(page)).toContain('Worked with other values than the workbook’s own: acid.');
  expect(words(part(page, 'given'))).toMatch(/acid at least 0.* the workbook has 1\.8 2 mol/);
});

test('the column for output is named only over sections that have outputs', () => {
  const page = renderReport(kettle());
  const head = (id: string) => /<div class="row heading">[^]*?<\/div>/.exec(part(page, id))![0];
  for (const id of ['answers', 'given', 'steps', 'checks']) expect(head(id)).toContain('>Output<');
  for (const id of ['limits-of-use', 'versions']) expect(head(id)).not.toContain('>Output<');
});

test('states are told by words, not by colour alone', () => {
  expect(words(renderReport(hostile()))).toMatch(/no value.*not passed/);
});

test('the source sheet has rows, columns, exact values and formulas, with copies named once', () => {
  const source = part(renderReport(tableOfCases()), 'source');
  expect(source).toMatch(/<th scope="col">J<\/th>/);
  expect(source).toMatch(/<th scope="row">208<\/th>/);
  expect(source).toMatch(/id="cell-1-E9"[^>]*>\s*<data value="0\.8360\d+" title="0\.8360\d+"/);
  expect(words(source)).toMatch(/E9:E208 =EXTENT\.SOLVE\(.* the first of 200 alike/);
});

test('no text of a workbook becomes markup or style', () => {
  const page = renderReport(hostile());
  expect(page).not.toContain('<script');
  expect(page.match(/<\/style>/g)).toHaveLength(1);
  expect(words(page)).toContain(HOSTILE);
  expect(page).not.toMatch(/href="(?!#)/);
});

test('the caution stands on every page', () => {
  for (const [, evaluation] of ALL)
    expect(words(renderReport(evaluation))).toContain(
      'Local codes, the law and licensed practice come first.',
    );
});
