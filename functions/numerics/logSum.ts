/**
 * A weighted sum of logarithms that keeps its last digits where it nearly vanishes.
 *
 *     S = sum w_i ln x_i + constant
 *
 * ln 1e-300 is rounded by 1e-13, though the sum that it belongs to may be near zero. So each x is
 * split into m 2^e with m within a factor sqrt 2 of 1. The exponents are summed exactly, and only
 * ln m, never above 0.35, is rounded.
 */
import { exponentOf, fractionOf } from './binary.ts';

/** 2^-53: the relative error of one rounding. */
export const ROUNDING = Number.EPSILON / 2;

/** The largest sum of abs(w) for which the sum of exponents stays exact: 34 bits. */
export const LARGEST_WEIGHT_SUM = 1000;

/** Weights are split on a grid of 2^-13: multiples of it are summed exactly, what is left of 1/3 apart. */
const GRID = 8192;

/** ln 2 in two parts. The first has 19 bits: its product with a sum of up to 34 bits is exact. */
const LN2_HIGH = 363409 / 524288;
const LN2_LOW = -4.787418125030828e-7;

/** The terms of the sum, in arrays that the caller owns. */
export interface LogSum {
  readonly weight: Float64Array;
  /** The weights rounded to the grid (`nearestOnGrid`), and what that left of them. */
  readonly gridWeight: Float64Array;
  readonly gridRest: Float64Array;
  /** The arguments x: positive and finite. */
  readonly value: Float64Array;
  /** The constant, as a sum of two numbers that is not carried out. */
  constant: number;
  constantRest: number;
  /** sum of w e where x is held as x 2^-e, split as the weights are. */
  twos: number;
  twosRest: number;
}

/** The weight on the grid. */
export function nearestOnGrid(weight: number): number {
  return Math.round(weight * GRID) / GRID;
}

/**
 * S over the terms from `from` up to, not including, `to`.
 *
 * ## Method
 * 1. Split x = m 2^e, m between sqrt(1/2) and sqrt 2.
 * 2. Sum w e on the grid, exactly; w ln m, rounded; what the grid left of w, times e.
 * 3. The grid sum times the upper part of ln 2 is exact. Where S is small it cancels against the
 *    constant before anything smaller is added.
 */
export function logSum(sum: LogSum, from: number, to: number): number {
  const { weight, gridWeight, gridRest, value } = sum;
  let twos = sum.twos;
  let twosRest = sum.twosRest;
  let logs = 0;
  for (let i = from; i < to; i++) {
    const exponent = exponentOf(value[i]!);
    twos += gridWeight[i]! * exponent;
    twosRest += gridRest[i]! * exponent;
    logs += weight[i]! * Math.log(fractionOf(value[i]!, exponent));
  }
  return twos * LN2_HIGH + sum.constant + (logs + (twos * LN2_LOW + twosRest * Math.LN2 + sum.constantRest));
}
