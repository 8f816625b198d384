/**
 * The amounts of a reaction in the order of its equation and in one unit.
 */
import type { Reaction } from '../../chemistry/equation.ts';
import { inputError } from '../../errors.ts';
import type { AmountsTable } from '../reading/amounts.ts';
import { linePlace } from '../reading/tableForm.ts';
import { matchedLines, type MatchedLines } from './matchedLines.ts';

export interface Feed {
  readonly matched: MatchedLines;
  /** One amount for each species of the equation. */
  readonly feed: readonly number[];
}

/**
 * The feed that a table states for a reaction.
 *
 * Errors: those of `matchedLines`, and `amounts-negative` unless removal is allowed.
 */
export function feedOf(reaction: Reaction, table: AmountsTable, isRemovalAllowed = false): Feed {
  const matched = matchedLines(table.form, reaction);
  const { amounts } = table;
  for (let i = 0; i < amounts.length; i++) {
    if (amounts[i]! >= 0 || (isRemovalAllowed && matched.speciesOf[i] !== -1)) continue;
    throw negativeAmount(table, i);
  }
  return { matched, feed: matched.reacting.map((position, i) => amounts[position]! * matched.factors[i]!) };
}

/** The error of a line whose amount is negative. */
export function negativeAmount({ form, amounts }: AmountsTable, position: number) {
  const line = form.lines[position]!;
  const unit = line.unit === null ? '' : ` ${line.unit.text}`;
  return inputError('amounts-negative', {
    place: linePlace(form, line),
    amount: `${amounts[position]!}${unit}`,
  });
}
