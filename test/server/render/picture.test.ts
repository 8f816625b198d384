import { expect, test } from 'vitest';
import type { ExtentOutcome } from '../../../functions/equilibrium/extentOutcome.ts';
import { extentPicture } from '../../../server/render/picture/extentPicture.ts';
import { closedVessel } from './fixtures/closedVessel.ts';
import { converter } from './fixtures/converter.ts';
import { kettle } from './fixtures/kettle.ts';
import type { Evaluation } from '../../../server/evaluation.ts';

const PIXEL = 0.01;

function outcomeIn(evaluation: Evaluation): ExtentOutcome {
  const outcomes = Object.values(evaluation.formulas).flatMap(({ answers }) =>
    answers.map(({ outcome }) => outcome),
  );
  return outcomes.find((outcome) => outcome !== null) as ExtentOutcome;
}

function drawing(outcome: ExtentOutcome): string {
  return extentPicture(outcome, 'p')!.markup;
}

function attribute(markup: string, element: RegExp, name: string): number {
  const found = new RegExp(` ${name}="([^"]+)"`).exec(element.exec(markup)![0])!;
  return Number(found[1]);
}

/** The straight scale through the ticks of an axis: from places in the picture to values. */
function scaleOf(markup: string, anchor: 'x' | 'y'): (place: number) => number {
  const ticks =
    anchor === 'x'
      ? /x1="([\d.]+)"\s+x2="\1"\s+y1="242"[^>]*>\s*<text[^>]*>\s*([^<\s]+)/g
      : /y1="([\d.]+)"\s+y2="\1"[^>]*>\s*<text[^>]*text-anchor="end"[^>]*>\s*([^<\s]+)/g;
  const found = [...markup.matchAll(ticks)].map(([, place, value]) => ({
    place: Number(place),
    value: Number(value),
  }));
  const [first, last] = [found[0]!, found.at(-1)!];
  return (place) =>
    first.value + ((place - first.place) * (last.value - first.value)) / (last.place - first.place);
}

const EQUILIBRIUM = /<circle class="mark equilibrium"[^>]*>/;
const LEVEL = /<line\s+class="level"[^>]*>/;

test.each([
  ['kettle', kettle()],
  ['converter', converter()],
])('%s: the curve passes through the equilibrium point, on the level of K', (_, evaluation) => {
  const outcome = outcomeIn(evaluation);
  const markup = drawing(outcome);
  const x = attribute(markup, EQUILIBRIUM, 'cx');
  const y = attribute(markup, EQUILIBRIUM, 'cy');
  const path = / d="(M[^"]*L[^"]*)"/
    .exec(markup)![1]!
    .slice(1)
    .split('L')
    .map((point) => point.split(',').map(Number));
  expect(path.some((point) => Math.abs(point[0]! - x) <= PIXEL && Math.abs(point[1]! - y) <= PIXEL)).toBe(
    true,
  );
  expect(attribute(markup, LEVEL, 'y1')).toBe(y);
  // a place is rounded to 0.01 of about 200 to 320 pixels, so a value to 1e-4 of the range shown
  const range = 30;
  expect(scaleOf(markup, 'x')(x)).toBeCloseTo(outcome.extent, 2);
  expect(Math.abs(scaleOf(markup, 'y')(y) - outcome.problem.lnK)).toBeLessThan(1e-4 * range);
  expect(
    path.every(
      (point, index) =>
        index === 0 || (point[0]! >= path[index - 1]![0]! && point[1]! <= path[index - 1]![1]!),
    ),
  ).toBe(true);
});

test('where a phase runs out the end is marked at the limit, away from the level of K', () => {
  const outcome = outcomeIn(closedVessel());
  const markup = drawing(outcome);
  const end = /<circle class="mark end"[^>]*>/;
  expect(attribute(markup, end, 'cx')).toBe(
    attribute(markup, /<line\s+class="limit"[^>]*>(?![^]*class="limit")/, 'x1'),
  );
  expect(attribute(markup, end, 'cy')).toBeGreaterThan(attribute(markup, LEVEL, 'y1'));
  expect(markup).toContain('It does not meet the level of K');
  expect(markup).not.toMatch(EQUILIBRIUM);
});

test('axes carry quantity and unit, and the picture a title and a description', () => {
  const markup = drawing(outcomeIn(kettle()));
  expect(markup.replace(/<[^>]+>/g, '').replace(/\s+/g, ' ')).toMatch(/extent &#958; \/ mol/);
  expect(markup).toContain('<title id="p-title">');
  expect(markup).toContain('It meets the level of K, ln K = 1.41099, at an extent of 1.5195 mol.');
});

test('a feed that leaves no room has no picture', () => {
  const outcome = outcomeIn(kettle());
  expect(extentPicture({ ...outcome, limits: [0, 0] }, 'p')).toBeNull();
});
