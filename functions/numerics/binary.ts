/** The binary exponent of a double, read and changed without rounding. */

/** The smallest double that has all its 53 bits: 2^-1022. */
export const SMALLEST_NORMAL = 2.2250738585072014e-308;

/** A double and its upper word: sign, exponent, and the first 20 bits of the fraction. */
const DOUBLE = new Float64Array(1);
const WORDS = new Int32Array(DOUBLE.buffer);
const UPPER = new Uint8Array(new Uint16Array([1]).buffer)[0] === 1 ? 1 : 0;
const FRACTION_BITS = 20;
/** The upper word of sqrt(1/2): measured from it, the exponent changes at sqrt(1/2) instead of at 1. */
const UPPER_OF_ROOT_HALF = 0x3fe6a09e;

/** 2^e for e from -1074 to 1023, at position e + 1074. */
const LOWEST = -1074;
const HIGHEST = 1023;
const POWERS = powersOfTwo();

/**
 * e such that x 2^-e, the fraction of x, lies between sqrt(1/2) and sqrt 2 (to 20 bits); x is
 * positive and finite. A subnormal x has -1023 and a smaller fraction.
 */
export function exponentOf(x: number): number {
  DOUBLE[0] = x;
  return (WORDS[UPPER]! - UPPER_OF_ROOT_HALF) >> FRACTION_BITS;
}

/** x 2^-e, exactly, for e = exponentOf(x). */
export function fractionOf(x: number, e: number): number {
  return x * POWERS[-e - LOWEST]!;
}

/** x 2^e for a whole number e: exact, unless it underflows or overflows. */
export function timesPowerOfTwo(x: number, e: number): number {
  if (e >= LOWEST && e <= HIGHEST) return x * POWERS[e - LOWEST]!;
  const nearest = e < 0 ? LOWEST : HIGHEST;
  // beyond twice the range the result is 0 or infinite anyway
  const rest = Math.max(LOWEST, Math.min(HIGHEST, e - nearest));
  return x * POWERS[nearest - LOWEST]! * POWERS[rest - LOWEST]!;
}

function powersOfTwo(): Float64Array {
  const powers = new Float64Array(HIGHEST - LOWEST + 1);
  let power = 1;
  for (let e = 0; e <= HIGHEST; e++, power *= 2) powers[e - LOWEST] = power;
  power = 1;
  for (let e = 0; e >= LOWEST; e--, power /= 2) powers[e - LOWEST] = power;
  return powers;
}
