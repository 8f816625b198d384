/** The solver beside the 50-digit oracle on seeded random problems. */
import type { BigNumber } from 'mathjs';
import { solveExtent, type ExtentOutcome } from '../../functions/equilibrium/index.ts';
import { randomExtentProblem, type Spread } from '../random/extentProblem.ts';
import { seededRandom } from '../random/xorshift.ts';
import { exactNumber, solveInFiftyDigits, type OracleAnswer } from './extentOracle.ts';

export interface Comparison {
  /** The largest relative error of any amount in the normal range of doubles. */
  readonly worst: number;
  /** Problems on which the two differ in kind, or in which amounts are exactly 0. */
  readonly disagreements: ExtentOutcome[];
}

const SMALLEST_NORMAL = 2 ** -1022;

/** The kinds of answer that mean the same. */
const SAME: Record<string, OracleAnswer['kind']> = {
  settled: 'root',
  'at limit': 'root',
  exhausted: 'limit',
  blocked: 'no room',
};

export function compareWithOracle(seed: number, count: number, spread: Spread): Comparison {
  const random = seededRandom(seed);
  const disagreements: ExtentOutcome[] = [];
  let worst = 0;
  for (let i = 0; i < count; i++) {
    const problem = randomExtentProblem(random, spread);
    const outcome = solveExtent(problem);
    const { kind, amounts } = solveInFiftyDigits(problem);
    const isSame =
      SAME[outcome.status] === kind &&
      amounts.every((n, j) => n.isZero() === (outcome.lnAmounts[j] === null));
    if (!isSame) disagreements.push(outcome);
    else amounts.forEach((n, j) => (worst = Math.max(worst, relativeError(outcome.amounts[j]!, n))));
  }
  return { worst, disagreements };
}

function relativeError(found: number, right: BigNumber): number {
  if (found < SMALLEST_NORMAL) return 0;
  return exactNumber(found).div(right).minus(1).abs().toNumber();
}
