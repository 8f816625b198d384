import type { ExtentProblem } from '../../../functions/equilibrium/index.ts';

/** ln Q - ln K at an extent, as a textbook writes it; all species mixed, mole fractions. */
export function affinity(
  { stoichiometry, feed, inert, lnScale, lnK }: ExtentProblem,
  extent: number,
): number {
  let sum = -lnK;
  let change = 0;
  let total = inert;
  for (let i = 0; i < feed.length; i++) {
    const nu = stoichiometry[i]!;
    const n = Math.max(feed[i]! + nu * extent, 0);
    sum += nu * Math.log(n);
    change += nu;
    total += n;
  }
  return sum + change * (lnScale - Math.log(total));
}
