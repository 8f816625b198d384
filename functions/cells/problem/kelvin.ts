import { convertValue } from '../../chemistry/units/convert.ts';
import { readUnit } from '../../chemistry/units/readUnit.ts';
import { inputError, withPlace } from '../../errors.ts';

/** A bare temperature in kelvin; `unit` is K where left out. Errors: `temperature-range`, those of the unit. */
export function kelvin(value: number, unit: string | undefined, argument: string): number {
  const temperatureK =
    unit === undefined
      ? value
      : withPlace(
          () => 'unit',
          () => convertValue(value, readUnit(unit), readUnit('K')),
        );
  if (temperatureK > 0) return temperatureK;
  throw inputError('temperature-range', { argument, value: `${value} ${unit ?? 'K'}` });
}
