/**
 * The search for the root of f, measured as a distance from the limit that it is nearest to.
 *
 * f is monotone in the extent, so a root between the limits is the only one. Near a limit where
 * mixed species vanish, f is a straight line in u = ln(distance); everywhere it is smooth in u, and
 * the amounts b + r x keep their relative precision as x goes to 0.
 */
import { timesPowerOfTwo } from '../numerics/binary.ts';
import type { Ending } from './extentOutcome.ts';
import { evaluate, scaleVanishing, slopeAtLimit } from './extentExpansion.ts';
import type { Terms } from './extentTerms.ts';
import type { Status } from './outcome.ts';

/** Where the search stands. */
interface Search extends Ending {
  /** `out of time` until it is decided otherwise. */
  status: Status;
  /** 1 from the lower limit, -1 from the upper one. */
  readonly side: number;
  /** Distance from the limit: `distance` times 2^`exponent`. */
  distance: number;
  exponent: number;
  /** The root lies between these distances. */
  lower: number;
  upper: number;
  /** The same with the side's sign: the extent from the limit. */
  unit: number;
  x: number;
  f: number;
  /** abs(f) one evaluation earlier. */
  before: number;
  evaluations: number;
}

/** Rounding may put the root a little beyond the middle between the limits. */
const BEYOND_MIDDLE = 1.25;
/** The middle is no good start for a root nearer to the limit than this part of the way (tried out). */
const NEAR_LIMIT = 0.1;
/** Shorter distances, below e^-693 or 2^-1000, are held apart from their power of two. */
const SMALLEST_LOG = -693;
/** The part of its rounding bound that f hardly ever uses up. */
const WELL_WITHIN = 1 / 16;
/** Far more than is ever needed: f is not what it should be. */
const MOST_EVALUATIONS = 100;
/** A corrected step stays within a factor 2 of Newton's, or Newton's own is taken. */
const LARGEST_CORRECTION = 0.5;
/** Without a lower bound the distance shrinks by this much. */
const SHRINK = 1 / 1024;

/**
 * Searches from the limit at which `terms` are expanded. `half` is the distance to the middle
 * between the limits, and `fHalf` is f there, with the sign that f has far from this limit.
 */
export function search(terms: Terms, side: number, half: number, fHalf: number): Ending {
  const state = initialState(terms, side, half, fHalf);
  while (state.status === 'out of time' && state.evaluations < MOST_EVALUATIONS) {
    assess(terms, state);
    if (isSettled(terms, state)) state.status = 'settled';
    else step(terms, state);
  }
  return state;
}

function initialState(terms: Terms, side: number, half: number, fHalf: number): Search {
  const state: Search = {
    status: 'out of time',
    reason: '',
    side,
    distance: half,
    exponent: 0,
    lower: 0,
    upper: half * BEYOND_MIDDLE,
    unit: 0,
    x: side * half,
    f: fHalf,
    before: Infinity,
    evaluations: 1,
  };
  const slope = slopeAtLimit(terms);
  if (slope === 0) {
    startWherePhaseRunsOut(terms, state);
  } else {
    step(terms, state);
    if (state.distance < NEAR_LIMIT * half) startOnAsymptote(terms, state, slope);
  }
  return state;
}

/** The limit's own straight line, f + slope u, in u = ln(distance). */
function startOnAsymptote(terms: Terms, state: Search, slope: number): void {
  const u = -evaluate(terms, state.side, 0) / slope;
  state.evaluations++;
  if (u < SMALLEST_LOG) {
    state.exponent = Math.round(u / Math.LN2);
    state.upper = Infinity;
    scaleVanishing(terms, state.exponent);
  }
  const distance = Math.exp(u - state.exponent * Math.LN2);
  state.distance = distance < state.upper ? distance : state.upper;
  state.f = Infinity;
}

/** No mixed species vanishes alone: f is finite at the limit, and may call for going beyond it. */
function startWherePhaseRunsOut(terms: Terms, state: Search): void {
  const { base, rate, weight, first, pure } = terms;
  const half = state.distance;
  const f = evaluate(terms, state.side, 0);
  state.evaluations++;
  if (Math.abs(f) <= terms.bound || f * state.side > 0) {
    state.status = Math.abs(f) <= terms.bound ? 'settled' : 'exhausted';
    state.x = 0;
    state.f = f;
    return;
  }
  let gradient = 0;
  for (let i = first; i < pure; i++) gradient += (weight[i]! * rate[i]!) / base[i]!;
  const distance = Math.abs(f / gradient);
  state.distance = distance < half ? distance : half;
  state.f = f;
}

function assess(terms: Terms, state: Search): void {
  state.before = Math.abs(state.f);
  state.unit = state.side * state.distance;
  state.x = timesPowerOfTwo(state.unit, state.exponent);
  state.f = evaluate(terms, state.unit, state.x);
  state.evaluations++;
  if (state.f * state.side < 0) state.lower = state.distance;
  else state.upper = state.distance;
}

/** f is zero: well within its rounding bound, or within it and falling no more. */
function isSettled({ bound }: Terms, { f, before }: Search): boolean {
  const size = Math.abs(f);
  return size <= bound * WELL_WITHIN || (size <= bound && size >= before / 2);
}

/**
 * One step of fourth order in u (Householder 1970), with t = d ln(value)/du of each term:
 *
 *     f' = sum w t,  f'' = sum w t (1 - t),  f''' = sum w t (1 - t)(1 - 2t)
 *
 * It costs no logarithm more than Newton's. The distance is multiplied by e^step, because rounding
 * u itself would cost digits; a step out of the bracket is replaced by its geometric middle.
 */
function step(terms: Terms, state: Search): void {
  const { base, rate, weight, value, first, pure } = terms;
  let slope = 0;
  let second = 0;
  let third = 0;
  for (let i = first; i < pure; i++) {
    const t = base[i] === 0 ? 1 : (rate[i]! * state.x) / value[i]!;
    const bend = weight[i]! * t * (1 - t);
    slope += weight[i]! * t;
    second += bend;
    third += bend * (1 - 2 * t);
  }
  const newton = -state.f / slope;
  const a = (newton * second) / (2 * slope);
  const b = (newton * newton * third) / (6 * slope);
  const correction = (1 + a) / (1 + 2 * a + b);
  const isMild = Math.abs(correction - 1) <= LARGEST_CORRECTION;
  const next = state.distance * Math.exp(isMild ? newton * correction : newton);
  const isInside = (next > state.lower && next < state.upper) || next === state.distance;
  state.distance = isInside ? next : middle(state.lower, state.upper);
}

function middle(lower: number, upper: number): number {
  return lower > 0 ? Math.sqrt(lower) * Math.sqrt(upper) : upper * SHRINK;
}
