/**
 * How far a reaction can run: the extents at which a species is used up, and the amounts there.
 *
 *     n_i = n_i0 + nu_i xi >= 0
 *
 * Decided in error-free arithmetic, so that two species which run out together are both exactly 0.
 */
import { differenceOfProducts, sumWithProduct } from '../numerics/twofold.ts';

/** Which side of the equation a species must stand on to be used up: reactants by running forward. */
export type Side = 'reactants' | 'products';

/**
 * Index of the species of one side that runs out first; -1 when that side is empty.
 *
 * The smallest n/abs(nu) decides. Correctly rounded quotients keep their order, so only equal ones
 * need the exact comparison. Of species that run out at the very same extent the one with the
 * smallest coefficient is taken, whatever the order of the equation.
 */
export function firstToRunOut(stoichiometry: readonly number[], feed: readonly number[], side: Side): number {
  const sign = side === 'reactants' ? -1 : 1;
  let first = -1;
  let smallest = Infinity;
  for (let i = 0; i < stoichiometry.length; i++) {
    const nu = sign * stoichiometry[i]!;
    if (nu < 0) continue;
    const reach = feed[i]! / nu;
    if (reach > smallest) continue;
    if (reach === smallest) {
      const nuFirst = sign * stoichiometry[first]!;
      const difference = differenceOfProducts(feed[i]!, nuFirst, nu, feed[first]!);
      if (difference > 0 || (difference === 0 && nu >= nuFirst)) continue;
    }
    first = i;
    smallest = reach;
  }
  return first;
}

/**
 * The smallest and the largest extent at which no amount is negative.
 *
 * `stoichiometry` holds the coefficients, products positive, and `feed` the amounts in the same
 * order; the extents are in their unit, each the exact limit rounded once. Without a product the
 * lower limit is -Infinity, without a reactant the upper one Infinity. With negative amounts
 * (removal) the lower limit may exceed the upper one: then no extent is feasible.
 */
export function extentLimits(
  stoichiometry: readonly number[],
  feed: readonly number[],
): [lowest: number, highest: number] {
  const product = firstToRunOut(stoichiometry, feed, 'products');
  const reactant = firstToRunOut(stoichiometry, feed, 'reactants');
  return [
    product < 0 ? -Infinity : limitOf(stoichiometry, feed, product),
    reactant < 0 ? Infinity : limitOf(stoichiometry, feed, reactant),
  ];
}

/** The extent at which species `k` is used up. */
export function limitOf(stoichiometry: readonly number[], feed: readonly number[], k: number): number {
  return -feed[k]! / stoichiometry[k]! + 0; // adding 0 makes -0 a plain 0, which JSON can hold
}

/**
 * The amount of one species at the extent where another, the limiting one, is exactly used up:
 * `(n nu_k - nu n_k)/nu_k`, rounded twice however much cancels.
 */
export function amountAtLimit(nu: number, feed: number, nuLimiting: number, feedLimiting: number): number {
  if (feedLimiting === 0) return feed;
  return differenceOfProducts(feed, nuLimiting, nu, feedLimiting) / nuLimiting + 0;
}

/**
 * The amounts at a given extent, each rounded once.
 *
 * At a limit as `extentLimits` gives it, the species that run out there are exactly 0. Beyond the
 * limits amounts come out negative; the caller decides what that means.
 */
export function amountsAtExtent(
  stoichiometry: readonly number[],
  feed: readonly number[],
  extent: number,
): number[] {
  for (const side of ['products', 'reactants'] as const) {
    const k = firstToRunOut(stoichiometry, feed, side);
    if (k >= 0 && extent === limitOf(stoichiometry, feed, k)) {
      return feed.map((n, i) => amountAtLimit(stoichiometry[i]!, n, stoichiometry[k]!, feed[k]!));
    }
  }
  return feed.map((n, i) => sumWithProduct(n, stoichiometry[i]!, extent));
}
