import { describe, expect, it } from 'vitest';
import { hasAnswer, solveExtent, type ExtentProblem } from '../../../functions/equilibrium/index.ts';
import { randomExtentProblem } from '../../random/extentProblem.ts';
import { seededRandom } from '../../random/xorshift.ts';
import { flawsOf } from './flaws.ts';

const SPREADS = [
  { lnK: 12, decades: 6 },
  { lnK: 100, decades: 30 },
  { lnK: 690, decades: 30 },
  { lnK: 1500, decades: 200 },
];

const problems = SPREADS.flatMap((spread, seed) => {
  const random = seededRandom(seed + 10);
  return Array.from({ length: 1000 }, () => randomExtentProblem(random, spread));
});

describe('over 4,000 random problems', () => {
  it('none is refused or out of time', () => {
    expect(problems.filter((problem) => !hasAnswer(solveExtent(problem)))).toEqual([]);
  });

  it('residuals stay within their bounds, extents within their limits, and ratios are conserved', () => {
    const flawed = problems
      .map((problem) => flawsOf(solveExtent(problem)))
      .filter((flaws) => flaws.length > 0);
    expect(flawed).toEqual([]);
  });

  it('equal inputs give equal bits, whatever was solved in between', () => {
    const first = problems.map((problem) => solveExtent(problem));
    const again = problems.toReversed().map((problem) => solveExtent(structuredClone(problem)));
    expect(again.toReversed()).toEqual(first);
  });

  it('an outcome survives JSON without loss', () => {
    const outcomes = problems.map((problem) => solveExtent(problem));
    expect(JSON.parse(JSON.stringify(outcomes))).toStrictEqual(outcomes);
  });

  it('the order of the species does not change a bit', () => {
    const random = seededRandom(20);
    for (const problem of problems) {
      const order = problem.species.map((_, i) => i);
      order.sort(() => random.number() - 0.5);
      const a = solveExtent(problem);
      const b = solveExtent(reordered(problem, order));
      expect([b.status, b.extent, b.residual]).toEqual([a.status, a.extent, a.residual]);
      expect(b.amounts).toEqual(pick(a.amounts, order));
      expect(b.lnAmounts).toEqual(pick(a.lnAmounts, order));
    }
  });

  it('does not change the problem', () => {
    const problem = problems[0]!;
    const copy = structuredClone(problem);
    solveExtent(problem);
    expect(problem).toEqual(copy);
  });
});

function reordered(problem: ExtentProblem, order: readonly number[]): ExtentProblem {
  const { species, stoichiometry, feed, mixed } = problem;
  return {
    ...problem,
    species: pick(species, order),
    stoichiometry: pick(stoichiometry, order),
    feed: pick(feed, order),
    mixed: pick(mixed, order),
  };
}

function pick<Item>(items: readonly Item[], order: readonly number[]): Item[] {
  return order.map((i) => items[i]!);
}
