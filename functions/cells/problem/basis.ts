/**
 * What the amounts of a calculation measure.
 */
import type { Quantity } from '../../chemistry/units/unit.ts';
import { inputError } from '../../errors.ts';
import { type FormLine, linePlace, type TableForm } from '../reading/tableForm.ts';

export type Basis =
  'amount' | 'amount flow' | 'concentration' | 'molality' | 'pressure' | 'fraction' | 'no unit';

const BASIS: Partial<Record<Quantity, Basis>> = {
  amount: 'amount',
  mass: 'amount',
  'gas volume': 'amount',
  'amount flow': 'amount flow',
  'mass flow': 'amount flow',
  'gas volume flow': 'amount flow',
  concentration: 'concentration',
  'mass concentration': 'concentration',
  'charge concentration': 'concentration',
  molality: 'molality',
  pressure: 'pressure',
  fraction: 'fraction',
  'amount fraction': 'fraction',
  'volume fraction': 'fraction',
};

/**
 * The one basis of these lines; there must be at least one.
 *
 * Errors: `amounts-unit-kind` (a unit that is no amount), `amounts-mixed` (two bases together).
 */
export function commonBasis(lines: readonly FormLine[], form: TableForm): Basis {
  const first = lines[0]!;
  const basis = basisOf(first, form);
  for (const line of lines) {
    if (basisOf(line, form) === basis) continue;
    throw inputError('amounts-mixed', {
      first: `${linePlace(form, first)} is in ${unitText(first)}`,
      second: `${linePlace(form, line)} in ${unitText(line)}`,
    });
  }
  return basis;
}

/** The one unit that all lines have; null where they have several, or none. */
export function unitOfAll({ lines }: TableForm): string | null {
  const text = lines[0]?.unit?.text ?? null;
  return lines.every(({ unit }) => unit?.text === text) ? text : null;
}

/** The unit of a line in words. */
export function unitText({ unit }: FormLine): string {
  return unit?.text ?? 'no unit';
}

function basisOf(line: FormLine, form: TableForm): Basis {
  if (line.unit === null) return 'no unit';
  const basis = BASIS[line.unit.quantity];
  if (basis !== undefined) return basis;
  throw inputError('amounts-unit-kind', { place: linePlace(form, line), unit: line.unit.text });
}
