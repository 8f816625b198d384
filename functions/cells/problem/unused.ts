/**
 * The condition rows that a calculation did not need. One table may serve many formulas, so that
 * they are no error; the evidence lists them.
 */
import type { ConditionName } from '../reading/conditionRows.ts';
import type { ExtentSetup } from './extentSetup.ts';

/** Rows that state what the calculation goes by, whatever it is. */
const ALWAYS_USED: readonly ConditionName[] = [
  'medium',
  'K written as',
  'removal',
  'activity model',
  'gas model',
];

export function unusedConditions({ conditions: { rows }, setting, matched }: ExtentSetup): string[] {
  const used = new Set<ConditionName>(ALWAYS_USED);
  const { medium, change, isFraction } = setting;
  const terms = rows.get('K in terms of')?.value;
  if (change !== 0) used.add('K in terms of');
  // These two choose how a gas is taken, also where their value cancels.
  if (medium === 'gas') used.add('pressure').add('volume');
  if (change !== 0 && medium === 'gas') {
    if (terms === 'concentration' || (!isFraction && matched.basis !== 'pressure')) used.add('temperature');
  }
  if (change !== 0 && medium === 'solution' && matched.basis === 'amount') used.add('volume');
  if (used.has('pressure') && rows.get('pressure')?.unit?.quantity === 'gauge pressure')
    used.add('barometer');
  return [...rows.keys()].filter((name) => !used.has(name));
}
