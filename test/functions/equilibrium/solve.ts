/** A problem written shortly: all species mixed, activities n/N, K on that basis, unless said. */
import { solveExtent, type ExtentOutcome, type ExtentProblem } from '../../../functions/equilibrium/index.ts';

type Short = Pick<ExtentProblem, 'stoichiometry' | 'feed' | 'lnK'> & Partial<ExtentProblem>;

export function problemOf(given: Short): ExtentProblem {
  return {
    species: given.stoichiometry.map((_, i) => 'ABCDEF'[i]!),
    mixed: given.stoichiometry.map(() => true),
    activity: 'fraction',
    lnScale: 0,
    inert: 0,
    ...given,
  };
}

export function solve(given: Short): ExtentOutcome {
  return solveExtent(problemOf(given));
}

/** abs(found/expected - 1) */
export function relativeError(found: number, expected: number): number {
  return Math.abs(found / expected - 1);
}
