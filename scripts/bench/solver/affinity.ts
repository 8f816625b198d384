import { evaluate, expandAtFeed } from '../../../functions/equilibrium/extentExpansion.ts';
import { termsOf } from '../../../functions/equilibrium/extentTerms.ts';
import type { ExtentProblem } from '../../../functions/equilibrium/index.ts';

/** ln Q - ln K as a function of the extent. */
export type Affinity = (problem: ExtentProblem) => (extent: number) => number;

/** The solver's own function, whose sums keep their digits where they cancel. */
export const solversOwn: Affinity = (problem) => {
  const terms = termsOf(problem);
  expandAtFeed(terms);
  return (extent) => evaluate(terms, extent, extent);
};

/** As a textbook writes it, for mole fractions; it is cheaper, and loses digits. */
export const plain: Affinity =
  ({ stoichiometry, feed, inert, lnScale, lnK }) =>
  (extent) => {
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
  };
