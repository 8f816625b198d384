import type { Outcome } from '../../../functions/equilibrium/outcome.ts';

/** Equal for equal problems that were solved alike. */
export function solutionKey(outcome: Outcome): string {
  return JSON.stringify(outcome);
}
