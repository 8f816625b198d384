import { convertValue, toBase } from '../../chemistry/units/convert.ts';
import { readUnit } from '../../chemistry/units/readUnit.ts';
import type { Unit } from '../../chemistry/units/unit.ts';
import { inputError, withPlace } from '../../errors.ts';
import { defineFunction } from '../entry.ts';
import { describe } from '../parameters/describe.ts';
import { number } from '../parameters/number.ts';
import { text } from '../parameters/text.ts';

export const unitsConvert = defineFunction({
  name: 'UNITS.CONVERT',
  summary: 'A value in another unit of the same quantity.',
  parameters: {
    value: number('Value; a temperature is a temperature, not a difference.'),
    from: text('Its unit.'),
    to: text('The unit wanted.'),
  },
  gives: 'the value in the unit wanted',
  sources: ['SI Brochure, 9th edition; NIST SP 811 (from memory)'],
  examples: [
    {
      formula: '=UNITS.CONVERT(25, "degC", "K")',
      gives: 298.15,
      within: 1e-15,
      source: 'SI Brochure, 9th edition, section 2.3.1',
    },
    {
      formula: '=UNITS.CONVERT(1, "atm", "kPa")',
      gives: 101.325,
      within: 1e-15,
      source: 'NIST SP 811, table B.8',
    },
    { formula: '=UNITS.CONVERT(1, "kg", "bar")', gives: { error: 'unit-incompatible' }, source: 'by hand' },
  ],
  run({ value, from, to }) {
    const wanted = unitOf(to, 'to');
    const given = unitOf(from, 'from');
    if (given.quantity === 'temperature' && !(toBase(value, given) >= 0)) {
      throw inputError('temperature-range', { argument: 'value', value: `${value} ${given.text}` });
    }
    const converted = convertValue(value, given, wanted);
    if (Number.isFinite(converted)) return { value: converted, unit: wanted.text };
    throw inputError('argument-kind', {
      argument: 'value',
      given: describe(value),
      wanted: `a number that a cell can hold in ${wanted.text}`,
    });
  },
});

function unitOf(written: string, argument: string): Unit {
  return withPlace(
    () => argument,
    () => readUnit(written),
  );
}
