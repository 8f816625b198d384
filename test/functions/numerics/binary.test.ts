import { describe, expect, it } from 'vitest';
import {
  exponentOf,
  fractionOf,
  SMALLEST_NORMAL,
  timesPowerOfTwo,
} from '../../../functions/numerics/binary.ts';

const NORMAL = [1, 0.7, 0.71, 1.41, 1.42, 3, 1e300, Number.MAX_VALUE, 1e-300, SMALLEST_NORMAL];
const SUBNORMAL = [1e-310, 5e-324];

describe('the binary exponent', () => {
  it.each(NORMAL)('leaves of %d a fraction between sqrt(1/2) and sqrt 2', (x) => {
    const fraction = fractionOf(x, exponentOf(x));
    expect(fraction).toBeGreaterThan(Math.SQRT1_2 * (1 - 2 ** -20));
    expect(fraction).toBeLessThan(Math.SQRT2 * (1 + 2 ** -20));
  });

  it.each([...NORMAL, ...SUBNORMAL])('and the fraction give %d back', (x) => {
    expect(timesPowerOfTwo(fractionOf(x, exponentOf(x)), exponentOf(x))).toBe(x);
  });
});

describe('timesPowerOfTwo', () => {
  it('is exact inside the range of doubles', () => {
    expect(timesPowerOfTwo(3, 5)).toBe(96);
    expect(timesPowerOfTwo(1, -1074)).toBe(5e-324);
    expect(timesPowerOfTwo(5e-324, 2000)).toBe(2 ** 926);
    expect(timesPowerOfTwo(2 ** 1000, -2050)).toBe(2 ** -1050);
  });

  it('goes to 0 and to infinity beyond it', () => {
    expect(timesPowerOfTwo(1, -1e6)).toBe(0);
    expect(timesPowerOfTwo(1, 1e6)).toBe(Infinity);
  });
});
