/** In which unit a solution's amounts are: an outcome does not say, but a cell that shows its extent does. */
import type { Outcome } from '../../../functions/equilibrium/outcome.ts';
import type { Evaluation } from '../../evaluation.ts';

/** Their answer has the unit of the amounts. */
const IN_UNIT_OF_AMOUNTS = ['EXTENT.SOLVE', 'COMPOSITION.AT.EQUILIBRIUM'];

/** The unit of the amounts of an outcome; null where no cell of the workbook tells it. */
export type AmountUnits = (outcome: Outcome) => string | null;

export function amountUnits(evaluation: Evaluation): AmountUnits {
  const units = new Map<string, string>();
  for (const answer of Object.values(evaluation.formulas).flatMap(({ answers }) => answers)) {
    if (answer.outcome === null || !answer.unit || !IN_UNIT_OF_AMOUNTS.includes(answer.function)) continue;
    units.set(solutionKey(answer.outcome), answer.unit);
  }
  return (outcome) => units.get(solutionKey(outcome)) ?? null;
}

/** Equal for equal problems that were solved alike. */
export function solutionKey(outcome: Outcome): string {
  return JSON.stringify(outcome);
}
