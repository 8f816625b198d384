/**
 * Temperature, pressure and volume of a calculation, from its conditions.
 */
import { readUnit } from '../../chemistry/units/readUnit.ts';
import { inputError } from '../../errors.ts';
import type { ConditionName } from '../reading/conditionRows.ts';
import { type Conditions, measured } from '../reading/conditions.ts';

/** In kelvin, bar or litres; nothing on earth is larger, and no product of it overflows. */
const LARGEST_CONDITION = 1e15;

/** In bar: wider than from the highest mountain to the deepest mine; outside it the unit is a slip. */
const LOWEST_BAROMETER = 0.3;
const HIGHEST_BAROMETER = 1.4;

/** Temperature in kelvin. Errors: `condition-missing`, `condition-range`. */
export function temperatureK(conditions: Conditions, purpose: string): number {
  return positive('temperature', stated(conditions, 'temperature', 'K', purpose), 'K');
}

/** Absolute pressure in bar. Errors: `condition-missing`, `condition-range`, `barometer-range`. */
export function pressureBar(conditions: Conditions, purpose: string): number {
  const isGauge = conditions.rows.get('pressure')?.unit?.quantity === 'gauge pressure';
  if (!isGauge) return positive('pressure', stated(conditions, 'pressure', 'bar', purpose), 'bar');
  const gauge = stated(conditions, 'pressure', 'bar gauge', purpose);
  const barometer = stated(conditions, 'barometer', 'bar', 'a gauge pressure');
  if (!(barometer >= LOWEST_BAROMETER && barometer <= HIGHEST_BAROMETER)) {
    throw inputError('barometer-range', { value: barometer });
  }
  return positive('pressure', gauge + barometer, 'bar');
}

/** Volume in litres. Errors: `condition-missing`, `condition-range`. */
export function volumeL(conditions: Conditions, purpose: string): number {
  return positive('volume', stated(conditions, 'volume', 'L', purpose), 'L');
}

function stated(conditions: Conditions, name: ConditionName, unit: string, purpose: string): number {
  const value = measured(conditions, name, readUnit(unit));
  if (value === undefined) throw inputError('condition-missing', { name, purpose });
  return value;
}

function positive(name: string, value: number, unit: string): number {
  if (value > 0 && value <= LARGEST_CONDITION) return value;
  throw inputError('condition-range', { name, value: `${Number(value.toPrecision(6))} ${unit}` });
}
