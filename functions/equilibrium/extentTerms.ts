/**
 * ln(Q/K) along a reaction, as terms that all have one shape.
 *
 *     f(x) = sum w_i ln(b_i + r_i x) + constant
 *
 * x is the extent measured from a point of expansion, b_i the amounts there. A species of the
 * mixture has w = r = nu. With mole fractions the total amount is one more term, with w = -sum nu
 * and r = sum nu. A pure phase has no term, but its amount follows the same line.
 */
import { nearestOnGrid, ROUNDING, type LogSum } from '../numerics/logSum.ts';
import { productError, sumError } from '../numerics/twofold.ts';
import type { ExtentProblem } from './extentProblem.ts';

/**
 * The terms of one problem. Position 0 is the total amount; then come the mixed species, then the
 * pure phases, each in an order of their own values, so that the order of the equation cannot
 * change a bit of the answer.
 */
export class Terms implements LogSum {
  readonly weight: Float64Array;
  readonly gridWeight: Float64Array;
  readonly gridRest: Float64Array;
  readonly feed: Float64Array;
  /** r: change of the amount with the extent. */
  readonly rate: Float64Array;
  /** b: amount at the point of expansion, exactly 0 where it vanishes. */
  readonly base: Float64Array;
  readonly value: Float64Array;
  /** Where a species of the problem stands; and which species stands at a position. */
  readonly position: Int32Array;
  readonly species: Int32Array;
  constant = 0;
  constantRest = 0;
  twos = 0;
  twosRest = 0;
  /** Positions from `first` up to `pure` have a term; from `pure` up to `end` are pure phases. */
  first = 0;
  pure = 0;
  end = 0;
  inert = 0;
  /** The extent of the point of expansion. */
  origin = 0;
  /** Rounding bound of f near its root. */
  bound = 0;

  constructor(capacity: number) {
    this.weight = new Float64Array(capacity);
    this.gridWeight = new Float64Array(capacity);
    this.gridRest = new Float64Array(capacity);
    this.feed = new Float64Array(capacity);
    this.rate = new Float64Array(capacity);
    this.base = new Float64Array(capacity);
    this.value = new Float64Array(capacity);
    this.position = new Int32Array(capacity);
    this.species = new Int32Array(capacity);
  }
}

/** Terms are laid out here again for each problem; nothing of one problem reaches the next. */
let shared = new Terms(16);

/** The terms of a problem, to be used before the next call. */
export function termsOf(problem: ExtentProblem): Terms {
  const count = problem.species.length;
  if (shared.value.length <= count) shared = new Terms(2 * count);
  const terms = shared;
  terms.pure = place(terms, problem, true, 1);
  terms.end = place(terms, problem, false, terms.pure);
  weigh(terms, problem);
  return terms;
}

/** Places the mixed or the pure species from `start` on, by coefficient and then by amount. */
function place(terms: Terms, problem: ExtentProblem, mixed: boolean, start: number): number {
  const { stoichiometry } = problem;
  const { rate, feed, species } = terms;
  let end = start;
  for (let i = 0; i < stoichiometry.length; i++) {
    if (problem.mixed[i] !== mixed) continue;
    const nu = stoichiometry[i]!;
    const amount = problem.feed[i]!;
    let at = end++;
    for (; at > start && (rate[at - 1]! > nu || (rate[at - 1] === nu && feed[at - 1]! > amount)); at--) {
      rate[at] = rate[at - 1]!;
      feed[at] = feed[at - 1]!;
      species[at] = species[at - 1]!;
    }
    rate[at] = nu;
    feed[at] = amount;
    species[at] = i;
  }
  for (let at = start; at < end; at++) terms.position[species[at]!] = at;
  return end;
}

/** Sets weights, constant and bound. */
function weigh(terms: Terms, problem: ExtentProblem): void {
  const { weight, gridWeight, gridRest, rate, pure } = terms;
  let change = 0;
  let changeRest = 0;
  let size = 0;
  for (let i = 1; i < pure; i++) {
    const nu = rate[i]!;
    weight[i] = nu;
    gridWeight[i] = nearestOnGrid(nu);
    gridRest[i] = nu - gridWeight[i]!;
    change += gridWeight[i]!;
    changeRest += gridRest[i]!;
    size += Math.abs(nu);
  }
  const total = change + changeRest;
  weight[0] = -total;
  gridWeight[0] = -change;
  gridRest[0] = -changeRest;
  rate[0] = total;
  terms.first = problem.activity === 'fraction' && total !== 0 ? 0 : 1;
  terms.inert = problem.inert;

  const scale = change * problem.lnScale;
  terms.constant = scale - problem.lnK;
  terms.constantRest =
    sumError(scale, -problem.lnK, terms.constant) +
    (productError(change, problem.lnScale, scale) + changeRest * problem.lnScale);
  terms.twos = 0;
  terms.twosRest = 0;
  terms.bound = roundingBound(size, terms.first === 0 ? Math.abs(total) : 0, pure - terms.first);
}

/**
 * Bound of abs(computed f - f) where f is nearly 0, to first order in u = 2^-53.
 *
 * `size` is the sum of abs(nu) of the mixed species, `change` that of the total's term, `count` the
 * number of terms. Of each unit of weight:
 * - the argument: b is rounded twice, r x and the sum once each, and b may be twice the value: 6 u;
 *   the total adds 2 count u for the sum of its b;
 * - its logarithm (2 u, the library's) and the product with the weight: 3 u of at most 0.35;
 * - the sum of logarithms: count u of at most 0.35, and three more sums of that size;
 * - weights off the grid: 0.05 count u;
 * - the last bit of x itself, which moves f by at most 1 u.
 */
function roundingBound(size: number, change: number, count: number): number {
  return ROUNDING * ((size + change) * (9.1 + 0.4 * count) + 2 * count * change);
}
