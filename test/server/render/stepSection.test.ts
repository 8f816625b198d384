import { expect, test } from 'vitest';
import { renderReport } from '../../../server/render/report.ts';
import { converter } from './fixtures/converter.ts';
import { kettle } from './fixtures/kettle.ts';
import { CASES, tableOfCases } from './fixtures/tableOfCases.ts';
import { part, stepOf, words } from './seen.ts';

test('a step shows formula, sources, equation, evidence and result', () => {
  const step = stepOf(renderReport(converter()), '1.1');
  expect(words(step)).toContain('=EXTENT.SOLVE(B1, B2, A3:C7, A9:C10)');
  expect(words(step)).toContain('Bed!B2 K at 450 degC 0.00016');
  expect(step).toContain('<math');
  expect(words(step)).toMatch(
    /settled: Q equals K within rounding.*lowest feasible extent -1\.25 kmol\/h.*inert amount 8 kmol\/h/,
  );
  expect(step).toContain('<svg');
});

test('the evidence of a solution stands once; other cells with the same solution point there', () => {
  const page = renderReport(converter());
  expect(page.match(/<svg/g)).toHaveLength(1);
  expect(page.match(/class="equation"/g)).toHaveLength(1);
  expect(words(page)).toContain('settled: the solution of step 1.1, where its evidence stands.');
});

test('an array answer carries the names of the table that it stands beside', () => {
  const step = stepOf(renderReport(kettle()), '1.2');
  expect(words(step)).toMatch(/in mol acid 0\.480502 alcohol 1\.4805 ester 1\.5195 water 1\.9195/);
});

test('names are withheld where rows do not line up', () => {
  const evaluation = kettle();
  const moved = { ...evaluation.formulas['Kettle!E4']!, comesFrom: ['Kettle!B2', 'Kettle!A3:C6'] };
  const page = renderReport({ ...evaluation, formulas: { ...evaluation.formulas, 'Kettle!E4': moved } });
  expect(words(stepOf(page, '1.2'))).toMatch(/in mol E4 0\.480502 E5/);
});

test('the unit of an output that picks one cell of an array answer is not given to its neighbours', () => {
  const evaluation = kettle();
  const acid = { cell: 'Kettle!E4', value: 0.480502, unit: 'g', digits: 2 };
  const solve = evaluation.formulas['Kettle!E4']!;
  const unitless = { ...solve, answers: solve.answers.map((answer) => ({ ...answer, unit: null })) };
  const page = renderReport({
    ...evaluation,
    outputs: { acid },
    formulas: { ...evaluation.formulas, 'Kettle!E4': unitless },
  });
  const step = words(stepOf(page, '1.2'));
  expect(step).toContain('acid 0.480502');
  expect(step).not.toContain('in g');
});

test('a column of 200 cases is one step that counts its statuses and names its range', () => {
  const page = renderReport(tableOfCases());
  expect(page.match(/<article/g)).toHaveLength(3);
  const step = words(stepOf(page, '1.1'));
  expect(step).toContain(
    `The same formula in each of ${CASES} places, E9 to E208. The first is worked here.`,
  );
  expect(step).toMatch(/197 settled, 3 exhausted/);
  expect(step).toContain('smallest');
  expect(words(part(page, 'attention'))).toContain('E14, E81, E148 step 1.1 exhausted');
});

test('an amount below the range of numbers is shown from its logarithm', () => {
  const evaluation = kettle();
  const solve = evaluation.formulas['Kettle!E3']!;
  const outcome = {
    ...solve.answers[0]!.outcome!,
    status: 'at limit',
    amounts: [0, 1, 2, 2.4],
    lnAmounts: [-1000, 0, Math.log(2), Math.log(2.4)],
  };
  const changed = { ...solve, answers: [{ ...solve.answers[0]!, outcome }] } as typeof solve;
  const page = renderReport({ ...evaluation, formulas: { ...evaluation.formulas, 'Kettle!E3': changed } });
  // e^-1000 = 5.076e-435, by log10: -1000/2.302585 = -434.2945
  expect(page).toContain('5.076&#215;10<sup>\u2212435</sup>');
});
