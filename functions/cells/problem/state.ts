/**
 * Temperature, pressure and volume of a calculation, from its conditions.
 */
import { readUnit } from '../../chemistry/units/readUnit.ts';
import { inputError } from '../../errors.ts';
import { type Conditions, measured } from '../reading/conditions.ts';

/** In kelvin, bar or litres; nothing on earth is larger, and no product of it overflows. */
const LARGEST_CONDITION = 1e15;

/** Temperature in kelvin. Errors: `condition-missing`, `condition-range`. */
export function temperatureK(conditions: Conditions, purpose: string): number {
  return positive('temperature', measured(conditions, 'temperature', readUnit('K')), purpose);
}

/** Absolute pressure in bar. Errors: `condition-missing`, `condition-range`. */
export function pressureBar(conditions: Conditions, purpose: string): number {
  const row = conditions.rows.get('pressure');
  const stated = measured(
    conditions,
    'pressure',
    readUnit(row?.unit?.quantity === 'gauge pressure' ? 'bar gauge' : 'bar'),
  );
  if (row?.unit?.quantity !== 'gauge pressure') return positive('pressure', stated, purpose);
  const barometer = positive(
    'barometer',
    measured(conditions, 'barometer', readUnit('bar')),
    'a gauge pressure',
  );
  return positive('pressure', stated! + barometer, purpose);
}

/** Volume in litres. Errors: `condition-missing`, `condition-range`. */
export function volumeL(conditions: Conditions, purpose: string): number {
  return positive('volume', measured(conditions, 'volume', readUnit('L')), purpose);
}

function positive(name: string, value: number | undefined, purpose: string): number {
  if (value === undefined) throw inputError('condition-missing', { name, purpose });
  if (!(value > 0 && value <= LARGEST_CONDITION)) throw inputError('condition-range', { name, value });
  return value;
}
