/** ln Q along the extent, for a picture. */
import type { ExtentProblem } from './extentProblem.ts';
import { evaluate, expandAtLimit, slopeAtLimit } from './extentExpansion.ts';
import { termsOf, type Terms } from './extentTerms.ts';
import { amountAtLimit, firstToRunOut } from './limits.ts';

export interface CurvePoint {
  readonly extent: number;
  /** Infinite at a limit where a mixed species vanishes. */
  readonly lnQ: number;
}

/** Points in either half of the range. */
const POINTS_PER_HALF = 48;

/**
 * ln Q from the lowest feasible extent to the highest, the points closer together towards both, each
 * worked from the limit that it is nearer to. Empty where the feed leaves no range.
 *
 * The distance from the limit is w^3/(w^3 + (1 - w)^3) of the range at w = j/96: the first point is
 * a millionth of the range away from it, the middle ones 3 % apart.
 */
export function quotientCurve(problem: ExtentProblem): CurvePoint[] {
  const { stoichiometry: nu, feed } = problem;
  const product = firstToRunOut(nu, feed, 'products');
  const reactant = firstToRunOut(nu, feed, 'reactants');
  const room = amountAtLimit(nu[reactant]!, feed[reactant]!, nu[product]!, feed[product]!);
  if (!(room > 0)) return [];
  const range = room / -nu[reactant]!;

  const terms = termsOf({ ...problem, lnK: 0 });
  expandAtLimit(terms, nu[product]!, feed[product]!);
  const rising = half(terms, range, 1);
  expandAtLimit(terms, nu[reactant]!, feed[reactant]!);
  const falling = half(terms, range, -1);
  return [...rising, ...falling.reverse().slice(1)];
}

/** The limit itself, and the points up to the middle. */
function half(terms: Terms, range: number, side: number): CurvePoint[] {
  const isInfinite = slopeAtLimit(terms) !== 0;
  const points = [{ extent: terms.origin, lnQ: isInfinite ? -side * Infinity : evaluate(terms, side, 0) }];
  for (let j = 1; j <= POINTS_PER_HALF; j++) {
    const w = j / (2 * POINTS_PER_HALF);
    const near = w * w * w;
    const far = (1 - w) * (1 - w) * (1 - w);
    const x = (side * range * near) / (near + far);
    points.push({ extent: terms.origin + x, lnQ: evaluate(terms, x, x) });
  }
  return points;
}
