/**
 * ln Q along the extent, as points for drawing.
 *
 *     ln Q = sum over mixed species of nu_i (ln n_i + lnScale [- ln N])
 *
 * N, the amount in the mixture phase, counts where activities are mole fractions.
 */
import type { ExtentProblem } from '../../../functions/equilibrium/extentProblem.ts';
import { amountsAtExtent, extentLimits } from '../../../functions/equilibrium/limits.ts';

export interface CurvePoint {
  readonly extent: number;
  /** Infinite at a limit where a dissolved or gaseous species is used up. */
  readonly lnQ: number;
}

/** Even steps over each half of the feasible range. */
const EVEN_STEPS = 40;
/** Then closer and closer to the limit, each distance this part of the one before. */
const CLOSER = 0.6;
/** Closer than this part of the range no picture shows a difference. */
const CLOSEST = 1e-9;

/** From the lowest feasible extent to the highest, closer together towards both. */
export function quotientCurve(problem: ExtentProblem): CurvePoint[] {
  const [lowest, highest] = extentLimits(problem.stoichiometry, problem.feed);
  const half = (highest - lowest) / 2;
  const distances = distancesWithin(half);
  const from = (limit: number, direction: 1 | -1) => {
    const atLimit = amountsAtExtent(problem.stoichiometry, problem.feed, limit);
    return distances.map((distance) => ({
      extent: limit + direction * distance,
      lnQ: logQuotient(problem, atLimit, direction * distance),
    }));
  };
  return [...from(lowest, 1), ...from(highest, -1).reverse().slice(1)];
}

/** ln Q of the feed as it stands; infinite where a species of the mixture is absent. */
export function logQuotientOfFeed(problem: ExtentProblem): number {
  return logQuotient(problem, problem.feed, 0);
}

/** ln Q after a further extent from given amounts, which may be exactly 0 at a limit. */
function logQuotient(problem: ExtentProblem, amounts: readonly number[], further: number): number {
  const { stoichiometry, mixed, activity, lnScale, inert } = problem;
  const moved = amounts.map((amount, index) => amount + (stoichiometry[index] ?? 0) * further);
  const total = moved.reduce((sum, amount, index) => (mixed[index] ? sum + amount : sum), inert);
  const scale = activity === 'fraction' ? lnScale - Math.log(total) : lnScale;
  return moved.reduce(
    (sum, amount, index) =>
      mixed[index] ? sum + (stoichiometry[index] ?? 0) * (Math.log(amount) + scale) : sum,
    0,
  );
}

/** Growing, from 0 at the limit to half the range. */
function distancesWithin(half: number): number[] {
  const even = Array.from({ length: EVEN_STEPS }, (_, step) => (half * (step + 1)) / EVEN_STEPS);
  const close: number[] = [];
  for (let distance = half / EVEN_STEPS; distance > half * CLOSEST;) {
    distance *= CLOSER;
    close.unshift(distance);
  }
  return [0, ...close, ...even];
}
