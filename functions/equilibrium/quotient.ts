/** How a mixture as fed compares with equilibrium. Both functions take a problem that `flawOf` passes. */
import type { ExtentProblem } from './extentProblem.ts';
import { evaluate, expandAtFeed, slopeAtLimit } from './extentExpansion.ts';
import { termsOf } from './extentTerms.ts';
import { ROUNDING } from '../numerics/logSum.ts';

export interface Quotient {
  /** ln Q; null where a species of the mixture phase is absent, so that it is infinite or undefined. */
  readonly lnQ: number | null;
  /** What rounding may have done to ln Q. */
  readonly roundingBound: number;
  /** Indices of the species of the mixture phase of which nothing is there. */
  readonly absentReactants: number[];
  readonly absentProducts: number[];
}

/** Which way a reaction runs. */
export type Direction =
  | 'forward'
  | 'reverse'
  | 'at equilibrium'
  /** A phase that would have to be used up is absent, and the affinity still points that way. */
  | 'exhausted'
  /** A reactant and a product are absent, pure phases included: it can run neither way. */
  | 'blocked';

/**
 * The reaction quotient of the feed, with its rounding bound.
 *
 *     ln Q = sum over mixed species of nu_i ln a_i
 *
 * Pure phases count with an activity of 1 even at amount 0. With only products absent Q is 0, with
 * a reactant absent it has no number; the lists tell.
 */
export function reactionQuotient(problem: ExtentProblem): Quotient {
  const absentReactants: number[] = [];
  const absentProducts: number[] = [];
  problem.feed.forEach((n, i) => {
    if (n > 0 || !problem.mixed[i]) return;
    (problem.stoichiometry[i]! < 0 ? absentReactants : absentProducts).push(i);
  });
  if (absentReactants.length + absentProducts.length > 0) {
    return { lnQ: null, roundingBound: 0, absentReactants, absentProducts };
  }
  const terms = termsOf({ ...problem, lnK: 0 });
  expandAtFeed(terms);
  const lnQ = evaluate(terms, 0, 0);
  // away from 0 the last two roundings of the sum count as well
  const roundingBound = terms.bound + 2 * ROUNDING * Math.abs(lnQ);
  return { lnQ, roundingBound, absentReactants, absentProducts };
}

/**
 * The direction in which the feed reacts: the sign of ln(K/Q), which is zero within its rounding
 * bound at equilibrium, as far as the species that it uses up are there.
 *
 * An absent mixed species makes ln Q infinite. But where the whole mixture would come about at
 * constant composition, as a solid's own gas does at fixed pressure, its activities have numbers.
 */
export function direction(problem: ExtentProblem): Direction {
  const { stoichiometry, feed } = problem;
  const isForwardOpen = stoichiometry.every((nu, i) => nu > 0 || feed[i]! > 0);
  const isReverseOpen = stoichiometry.every((nu, i) => nu < 0 || feed[i]! > 0);
  if (!isForwardOpen && !isReverseOpen) return 'blocked';
  if (feed.some((n) => n < 0)) return isForwardOpen ? 'forward' : 'reverse';

  const terms = termsOf(problem);
  expandAtFeed(terms);
  const slope = slopeAtLimit(terms);
  const f = slope === 0 ? evaluate(terms, isForwardOpen ? 1 : -1, 0) : -slope * Infinity;
  if (Math.abs(f) <= terms.bound) return 'at equilibrium';
  if (f < 0) return isForwardOpen ? 'forward' : 'exhausted';
  return isReverseOpen ? 'reverse' : 'exhausted';
}
