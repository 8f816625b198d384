import { bignumberDependencies, create, logDependencies } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { logSum, nearestOnGrid, ROUNDING, type LogSum } from '../../../functions/numerics/logSum.ts';
import { exactDoubles } from '../../oracle/exactDouble.ts';
import { seededRandom } from '../../random/xorshift.ts';

const math = create({ ...bignumberDependencies, ...logDependencies }, { precision: 50 });

function sumOf(weights: readonly number[], values: readonly number[], constant: number): LogSum {
  const grid = weights.map(nearestOnGrid);
  return {
    weight: Float64Array.from(weights),
    gridWeight: Float64Array.from(grid),
    gridRest: Float64Array.from(weights, (w, i) => w - grid[i]!),
    value: Float64Array.from(values),
    constant,
    constantRest: 0,
    twos: 0,
    twosRest: 0,
  };
}

/** The double itself, not its shortest decimal. */
function exact(x: number) {
  const { mantissas, exponent } = exactDoubles([x]);
  return math.bignumber(String(mantissas[0])).times(math.bignumber(2).pow(exponent));
}

function inFiftyDigits(weights: readonly number[], values: readonly number[]) {
  return weights.reduce((sum, w, i) => sum.plus(exact(w).times(exact(values[i]!).ln())), math.bignumber(0));
}

describe('logSum', () => {
  it('adds weighted logarithms', () => {
    expect(logSum(sumOf([1, -1, 2], [8, 2, 0.5], 0.25), 0, 3)).toBeCloseTo(0.25, 15);
  });

  it('takes only the terms that it is asked for', () => {
    expect(logSum(sumOf([1, 1, 1], [0, Math.E, 0], 0), 1, 2)).toBeCloseTo(1, 15);
  });

  it('keeps 16 digits where sums of size 1e3 cancel, with whole, half and third weights', () => {
    const random = seededRandom(2);
    for (let i = 0; i < 300; i++) {
      const weights = Array.from({ length: 4 }, () => random.whole(1, 9) / random.whole(1, 3));
      const values = weights.map(() => 10 ** random.between(-300, 250));
      const logs = inFiftyDigits(weights, values);
      const constant = -logs.toNumber();
      const error = logs.plus(exact(constant)).minus(exact(logSum(sumOf(weights, values, constant), 0, 4)));
      // size of w ln m at most 0.35 each, rounded fewer than 12 times; see the bound in extentTerms.ts
      const size = weights.reduce((sum, w) => sum + w, 0);
      expect(Math.abs(error.toNumber())).toBeLessThan(ROUNDING * size * 0.35 * 12);
    }
  });

  it('takes subnormal arguments, whose logarithms of 35 are rounded to 2^-48', () => {
    expect(logSum(sumOf([1, -1], [5e-324, 2 ** -1073], 0), 0, 2)).toBeCloseTo(-Math.LN2, 13);
  });

  it('counts powers of two held apart', () => {
    expect(logSum({ ...sumOf([2], [0.75], 0), twos: -4000 }, 0, 1)).toBeCloseTo(
      2 * Math.log(0.75) - 4000 * Math.LN2,
      12,
    );
  });
});
