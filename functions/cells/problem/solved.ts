/**
 * A solved problem with an answer to go on with.
 */
import type { CheckedReaction } from '../../chemistry/balancedEquation.ts';
import { solveExtent } from '../../equilibrium/extent.ts';
import type { ExtentOutcome } from '../../equilibrium/extentOutcome.ts';
import { hasAnswer } from '../../equilibrium/outcome.ts';
import { inputError } from '../../errors.ts';
import type { AmountsTable } from '../reading/amounts.ts';
import type { Conditions } from '../reading/conditions.ts';
import { statedLnK } from './constant.ts';
import { type ExtentSetup, extentSetup } from './extentSetup.ts';

export interface SolvedExtent {
  readonly setup: ExtentSetup;
  readonly outcome: ExtentOutcome;
}

/** The arguments that every function of one solved reaction has. */
export interface ExtentArguments {
  readonly equation: CheckedReaction;
  readonly K: number;
  readonly amounts: AmountsTable;
  readonly conditions: Conditions | undefined;
}

/** The outcome, whatever its status. */
export function attempted({ equation, K, amounts, conditions }: ExtentArguments): SolvedExtent {
  const setup = extentSetup(equation, statedLnK(K, conditions), amounts, conditions);
  return { setup, outcome: solveExtent(setup.problem) };
}

/** The outcome where it has an answer. Errors: `not-solved`, with the status and the reason. */
export function solved(given: ExtentArguments): SolvedExtent {
  const result = attempted(given);
  const { status, reason } = result.outcome;
  if (!hasAnswer(result.outcome)) throw inputError('not-solved', { status, reason });
  return result;
}

/** The amount of a line of the table, in its own unit, from one amount for each species of the equation. */
export function amountInLine(
  { matched, table }: Pick<ExtentSetup, 'matched' | 'table'>,
  found: readonly number[],
  position: number,
): number {
  const index = matched.speciesOf[position]!;
  return index === -1 ? table.amounts[position]! : found[index]! / matched.factors[index]!;
}
