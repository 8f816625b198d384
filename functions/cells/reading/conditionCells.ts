/**
 * Reads the cells of one row of a conditions table after the rule of its quantity. `place` begins the
 * message of an error: `conditions row 2 (pressure)`.
 */
import { toBase } from '../../chemistry/units/convert.ts';
import { readUnit } from '../../chemistry/units/readUnit.ts';
import type { Unit } from '../../chemistry/units/unit.ts';
import { inputError, withPlace } from '../../errors.ts';
import type { CellScalar } from '../entry.ts';
import { describe } from '../parameters/describe.ts';
import type { ConditionRule } from './conditionRows.ts';

/** The number, the word or the species. Errors: `condition-value`. */
export function readValue(rule: ConditionRule, cell: CellScalar, place: string): number | string {
  switch (rule.holds) {
    case 'number':
    case 'pure number':
      if (typeof cell === 'number' && Number.isFinite(cell)) return cell;
      throw inputError('condition-value', { place, given: describe(cell), wanted: 'a number' });
    case 'species':
      if (typeof cell === 'string' && cell.trim() !== '') return cell.trim();
      throw inputError('condition-value', { place, given: describe(cell), wanted: 'the name of a species' });
    case 'word': {
      const word = rule.words.find(
        (w) => typeof cell === 'string' && w.toLowerCase() === cell.trim().toLowerCase(),
      );
      if (word !== undefined) return word;
      const wanted =
        rule.words.length === 1 ? `the word ${rule.words[0]}` : `one of ${rule.words.join(', ')}`;
      throw inputError('condition-value', { place, given: describe(cell), wanted });
    }
  }
}

/** Nothing is colder than absolute zero, and no pressure, volume or uncertainty is less than nothing. */
export function refuseImpossible(
  rule: ConditionRule,
  value: number | string,
  unit: Unit | null,
  place: string,
): void {
  if (typeof value !== 'number' || unit?.quantity === 'gauge pressure') return;
  const isPossible = unit === null ? value >= 0 : toBase(value, unit) > 0;
  if (isPossible) return;
  const wanted =
    rule.holds === 'number'
      ? `a ${rule.quantities[0]} above ${rule.quantities[0] === 'temperature' ? 'absolute zero' : '0'}`
      : 'a number of 0 or more';
  throw inputError('condition-value', { place, given: `${value} ${unit?.text ?? ''}`.trimEnd(), wanted });
}

/** The unit, null where the rule has none. Errors: `condition-unit`, `unit-unknown`. */
export function readConditionUnit(rule: ConditionRule, cell: CellScalar, place: string): Unit | null {
  const wanted = unitWanted(rule);
  if (cell === null || cell === '') {
    if (rule.holds !== 'number') return null;
    throw inputError('condition-unit', { place, given: 'no unit', wanted });
  }
  if (typeof cell !== 'string') throw inputError('condition-unit', { place, given: describe(cell), wanted });
  const unit = withPlace(
    () => place,
    () => readUnit(cell),
  );
  const allowed = rule.holds === 'number' || rule.holds === 'word' ? (rule.quantities ?? []) : [];
  if (allowed.includes(unit.quantity)) return unit;
  throw inputError('condition-unit', { place, given: `the unit ${unit.text}`, wanted });
}

function unitWanted(rule: ConditionRule): string {
  if (rule.holds === 'number') return `a unit of ${rule.quantities[0]} such as ${rule.unitExample}`;
  if (rule.holds === 'word' && rule.quantities !== undefined)
    return `a unit of ${rule.quantities.join(' or ')}`;
  return 'no unit';
}

/** The standard uncertainty. Errors: `condition-uncertainty`. */
export function readUncertainty(rule: ConditionRule, cell: CellScalar, place: string): number {
  if (rule.holds === 'number' && typeof cell === 'number' && cell >= 0 && Number.isFinite(cell)) return cell;
  throw inputError('condition-uncertainty', { place, given: describe(cell) });
}
