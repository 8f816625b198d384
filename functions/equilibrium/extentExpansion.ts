/**
 * Terms expanded at one extent, and ln(Q/K) along the reaction from there.
 *
 * At a limit the amounts of the species that run out are exactly 0. So a trace is r x, a product,
 * and never the difference of two large numbers.
 */
import { logSum } from '../numerics/logSum.ts';
import { differenceOfProducts } from '../numerics/twofold.ts';
import type { ExtentProblem } from './extentProblem.ts';
import type { Terms } from './extentTerms.ts';
import { amountAtLimit } from './limits.ts';

/** Expands at the extent where a species is used up, given its coefficient and its feed. */
export function expandAtLimit(terms: Terms, nuLimiting: number, feedLimiting: number): void {
  const { base, feed, rate, end } = terms;
  for (let i = 1; i < end; i++) base[i] = amountAtLimit(rate[i]!, feed[i]!, nuLimiting, feedLimiting);
  terms.origin = -feedLimiting / nuLimiting + 0;
  addUpTotal(terms);
}

/** Expands at the feed. */
export function expandAtFeed(terms: Terms): void {
  terms.base.set(terms.feed);
  terms.origin = 0;
  addUpTotal(terms);
}

function addUpTotal(terms: Terms): void {
  const { base, pure } = terms;
  let total = terms.inert;
  for (let i = 1; i < pure; i++) total += base[i]!;
  base[0] = total;
}

/**
 * f at the extent x from the point of expansion.
 *
 * Where b = 0 the amount is held as r `unit`: with `unit` = x, or x 2^-e when x is too small to be
 * held as a double (`scaleVanishing`).
 */
export function evaluate(terms: Terms, unit: number, x: number): number {
  const { base, rate, value, first, pure } = terms;
  for (let i = first; i < pure; i++) {
    value[i] = base[i] === 0 ? rate[i]! * unit : base[i]! + rate[i]! * x;
  }
  return logSum(terms, first, pure);
}

/**
 * df/du towards the point of expansion, u = ln abs(x): the coefficients of the mixed species that
 * vanish there. 0 where f is finite, because only pure phases vanish, or the whole mixture at a
 * constant composition.
 */
export function slopeAtLimit(terms: Terms): number {
  if (terms.first === 0 && terms.base[0] === 0) return 0;
  let slope = 0;
  for (let i = 1; i < terms.pure; i++) if (terms.base[i] === 0) slope += terms.rate[i]!;
  return slope;
}

/** Lets the amounts that vanish be held as r `unit`, 2^-exponent times what they are. */
export function scaleVanishing(terms: Terms, exponent: number): void {
  const { base, gridWeight, gridRest, pure } = terms;
  for (let i = 1; i < pure; i++) {
    if (base[i] !== 0) continue;
    terms.twos += gridWeight[i]! * exponent;
    terms.twosRest += gridRest[i]! * exponent;
  }
}

/**
 * Whether f is the same at every extent: nothing is mixed, or the mixture comes and goes with
 * constant composition, n_i0 : n_j0 = nu_i : nu_j, as a solid in its own gas does.
 */
export function isFlat(terms: Terms, activity: ExtentProblem['activity']): boolean {
  const { feed, rate, pure, inert } = terms;
  if (pure === 1) return true;
  if (activity === 'amount' || inert > 0) return false;
  for (let i = 2; i < pure; i++) {
    if (differenceOfProducts(feed[i]!, rate[1]!, feed[1]!, rate[i]!) !== 0) return false;
  }
  return true;
}
