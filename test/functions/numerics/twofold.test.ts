import { describe, expect, it } from 'vitest';
import {
  differenceOfProducts,
  productError,
  sumError,
  sumWithProduct,
} from '../../../functions/numerics/twofold.ts';
import { exactDoubles } from '../../oracle/exactDouble.ts';
import { seededRandom } from '../../random/xorshift.ts';

const random = seededRandom(1);
const wide = () => (random.chance(0.5) ? 1 : -1) * 10 ** random.between(-20, 20);

/** Whether terms add up to exactly nothing, in whole numbers. */
function cancel(...products: (readonly [number, number])[]): boolean {
  const exact = products.map(([a, b]) => {
    const { mantissas, exponent } = exactDoubles([a, b]);
    return { value: mantissas[0]! * mantissas[1]!, exponent: 2 * exponent };
  });
  const lowest = Math.min(...exact.map(({ exponent }) => exponent));
  return exact.reduce((sum, { value, exponent }) => sum + (value << BigInt(exponent - lowest)), 0n) === 0n;
}

describe('error-free sums and products', () => {
  it('give the error of a sum exactly', () => {
    for (let i = 0; i < 1000; i++) {
      const [a, b] = [wide(), wide()];
      expect(cancel([a, 1], [b, 1], [-(a + b), 1], [-sumError(a, b, a + b), 1])).toBe(true);
    }
    expect(sumError(1, 2 ** -60, 1)).toBe(2 ** -60);
  });

  it('give the error of a product exactly', () => {
    for (let i = 0; i < 1000; i++) {
      const [a, b] = [wide(), wide()];
      expect(cancel([a, b], [-(a * b), 1], [-productError(a, b, a * b), 1])).toBe(true);
    }
  });
});

describe('differenceOfProducts', () => {
  it('is exactly 0 for equal products only', () => {
    expect(differenceOfProducts(0.6, 1, 0.3, 2)).toBe(0);
    // 0.3 and 0.1 are not 3 to 1 as doubles: 0.1 is 5.55e-18 too large and 0.3 is 1.11e-17 too small
    expect(differenceOfProducts(0.3, 1, 0.1, 3)).toBe(-(2 ** -55));
  });

  it('keeps the relative precision of one rounding under cancellation', () => {
    for (let i = 0; i < 1000; i++) {
      const [a, b, c] = [wide(), random.whole(1, 9), random.whole(1, 9)];
      const d = ((a * b) / c) * (1 + random.whole(-3, 3) * Number.EPSILON);
      const { mantissas, exponent } = exactDoubles([a, d]);
      const exact = Number(mantissas[0]! * BigInt(b) - mantissas[1]! * BigInt(c)) * 2 ** exponent;
      // `exact` is rounded once, and so is the result
      expect(Math.abs(differenceOfProducts(a, b, c, d) - exact)).toBeLessThanOrEqual(
        Number.EPSILON * Math.abs(exact),
      );
    }
  });
});

describe('sumWithProduct', () => {
  it('rounds once', () => {
    const tenth = 0.1;
    expect(1 - 10 * tenth).toBe(0);
    expect(sumWithProduct(1, -10, tenth)).toBe(-(2 ** -54)); // 0.1 is 2^-54 / 10 too large
  });
});
