/**
 * The textbook way: bisection of ln Q - ln K as a function of the extent.
 *
 * Source: Burden and Faires, Numerical Analysis, section 2.1 (from memory).
 */
import { extentLimits, type ExtentProblem } from '../../../functions/equilibrium/index.ts';
import type { Affinity } from './affinity.ts';

/** The extent, halved until doubles hold nothing between the ends. */
export function solveByBisection(problem: ExtentProblem, affinity: Affinity): number {
  const f = affinity(problem);
  let [low, high] = extentLimits(problem.stoichiometry, problem.feed);
  for (;;) {
    const middle = low + (high - low) / 2;
    if (middle <= low || middle >= high) return middle;
    if (f(middle) < 0) low = middle;
    else high = middle;
  }
}
