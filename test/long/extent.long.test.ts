import { describe, expect, it } from 'vitest';
import { solveExtent } from '../../functions/equilibrium/index.ts';
import { flawsOf } from '../functions/equilibrium/flaws.ts';
import { compareWithOracle } from '../oracle/compare.ts';
import { randomExtentProblem } from '../random/extentProblem.ts';
import { seededRandom } from '../random/xorshift.ts';

describe('one reaction', () => {
  it.each([
    { seed: 101, lnK: 12, decades: 6 },
    { seed: 102, lnK: 100, decades: 30 },
    { seed: 103, lnK: 690, decades: 30 },
    { seed: 104, lnK: 1500, decades: 30 },
    { seed: 105, lnK: 1500, decades: 300 },
  ])('has no failure in 200,000 problems, abs ln K < $lnK, $decades decades', ({ seed, ...spread }) => {
    const random = seededRandom(seed);
    const flaws: string[] = [];
    let most = 0;
    for (let i = 0; i < 200_000; i++) {
      const outcome = solveExtent(randomExtentProblem(random, spread));
      flaws.push(...flawsOf(outcome));
      most = Math.max(most, outcome.iterations);
    }
    expect(flaws.slice(0, 5)).toEqual([]);
    expect(most).toBeLessThan(60); // 48 found, 15 where amounts span 30 decades
  });

  it.each([
    { seed: 201, lnK: 12, decades: 6 },
    { seed: 202, lnK: 100, decades: 30 },
    { seed: 203, lnK: 690, decades: 30 },
  ])('agrees with 50 digits on 10,000 problems, abs ln K < $lnK', ({ seed, ...spread }) => {
    const { worst, disagreements } = compareWithOracle(seed, 10_000, spread);
    expect(disagreements.slice(0, 5)).toEqual([]);
    expect(worst).toBeLessThan(1e-12);
  });
});
