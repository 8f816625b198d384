/**
 * The equilibrium constant as the conditions state it, brought to the activity basis of a medium.
 *
 * ln K(activity) = ln K(stated) + change * ln(reference), with `change` the sum of the stoichiometric
 * numbers of the mixed species, and the reference the size of the stated unit on the activity basis.
 */
import { GAS_CONSTANT_L_BAR } from '../../data/constants.ts';
import type { Unit } from '../../chemistry/units/unit.ts';
import { inputError } from '../../errors.ts';
import { type Conditions, NO_CONDITIONS } from '../reading/conditions.ts';
import { pressureBar, temperatureK } from './state.ts';
import type { Setting } from './medium.ts';

/** Beyond this the constant is a slip of the pen; exp(1500) exceeds any equilibrium that can be measured. */
const LARGEST_LN_K = 1500;

/**
 * ln K from the number in the cell, after `K written as`.
 *
 * Errors: `constant-value` (K not greater than 0, or abs(ln K) above 1500).
 */
export function statedLnK(K: number, conditions: Conditions = NO_CONDITIONS): number {
  const writtenAs = conditions.rows.get('K written as')?.value ?? 'K';
  if (writtenAs === 'K' && !(K > 0)) {
    throw inputError('constant-value', { given: `K = ${K}`, reason: 'a constant is greater than 0' });
  }
  const lnK = writtenAs === 'K' ? Math.log(K) : writtenAs === 'ln K' ? K : K * Math.LN10;
  if (Math.abs(lnK) > LARGEST_LN_K) {
    throw inputError('constant-value', { given: `${writtenAs} = ${K}`, reason: 'abs(ln K) is at most 1500' });
  }
  return lnK;
}

/**
 * ln of the reference that `K in terms of` states, on the activity basis of the medium: 1 bar for a
 * gas, 1 mol/L for a solution, the mole fraction for a liquid, the unit of the amounts as given.
 *
 * Errors: `constant-basis` (a basis that the medium does not have), `condition-missing` (it needs a
 * temperature or a pressure row that is not there).
 */
export function lnReference(
  { medium, change, isFraction }: Setting,
  conditions: Conditions,
  amountsUnit: Unit | null,
): number {
  const row = conditions.rows.get('K in terms of');
  if (row === undefined) return 0;
  const { value: terms, unit } = row;
  const basis = `${terms}${unit === null ? '' : ` ${unit.text}`}`;
  const refuse = (reason: string) => inputError('constant-basis', { basis, medium, reason });
  if (unit !== null && terms !== 'activity' && unit.quantity !== terms) {
    throw refuse(`${unit.text} is no unit of ${terms}`);
  }
  if (change === 0) return 0;
  if (medium === 'as given') {
    if (terms === 'activity' && unit === null) return 0;
    if (unit === null || unit.quantity !== amountsUnit?.quantity) {
      throw refuse('the amounts are taken as they are given, in another unit or none');
    }
    return Math.log(unit.factor / amountsUnit.factor);
  }
  if (terms === 'activity' && unit === null) return 0;
  if (terms === 'pressure' && unit === null) throw refuse('the unit of pressure is missing');
  if (terms === 'concentration' && unit === null) throw refuse('the unit of concentration is missing');
  switch (medium) {
    case 'gas':
      if (terms === 'mole fraction') {
        if (!isFraction) throw refuse('in a volume the pressure changes as the reaction runs');
        return Math.log(pressureBar(conditions, 'K in terms of mole fraction'));
      }
      if (unit!.quantity === 'pressure' && terms !== 'concentration') return Math.log(unit!.factor);
      if (unit!.quantity === 'concentration' && terms === 'concentration') {
        return Math.log(
          unit!.factor * GAS_CONSTANT_L_BAR * temperatureK(conditions, 'K in terms of concentration'),
        );
      }
      break;
    case 'solution':
      if (unit !== null && unit.quantity === 'concentration' && terms !== 'pressure')
        return Math.log(unit.factor);
      break;
    case 'ideal liquid':
      if (terms === 'mole fraction') return 0;
  }
  throw refuse('that basis and the medium do not go together');
}
