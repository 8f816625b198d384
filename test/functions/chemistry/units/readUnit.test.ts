import { describe, expect, test } from 'vitest';
import { readUnit } from '../../../../functions/chemistry/units/readUnit.ts';
import { messageOf } from '../../raises.ts';

test.each(['mol', 'bar', 'K', 'L', 'mol/L', 'g', 's', 'kJ', 'kJ/mol', 'J/(mol K)', 'mol/s'])(
  '%s is a base unit, of factor exactly 1',
  (text) => {
    expect(readUnit(text)).toMatchObject({ text, factor: 1, zero: 0 });
  },
);

test.each([
  ['°C', 'degC'],
  ['° C', 'degC'],
  ['℃', 'degC'],
  ['°F', 'degF'],
  ['m³', 'm3'],
  ['m^3', 'm3'],
  ['µmol/L', 'umol/L'],
  ['μg/L', 'ug/L'],
  ['mg/l', 'mg/L'],
  ['ml', 'mL'],
  ['  mol   % ', 'mol %'],
  ['barg', 'bar gauge'],
  ['Nm3 ( 0 °C,1 atm )', 'Nm3(0 degC, 1 atm)'],
])('%s is a spelling of %s', (spelling, text) => {
  expect(readUnit(spelling).text).toBe(text);
});

test.each([
  ['mol/h', 'amount flow', 1 / 3600],
  ['kmol/h', 'amount flow', 1000 / 3600],
  ['lbmol/hr', 'amount flow', 453.59237 / 3600],
  ['mmol/min', 'amount flow', 0.001 / 60],
  ['kg/h', 'mass flow', 1000 / 3600],
  ['t/d', 'mass flow', 1e6 / 86400],
  ['m3/h', 'volume flow', 1000 / 3600],
  ['kmol/s', 'amount flow', 1000],
])('%s is an %s', (text, quantity, factor) => {
  const unit = readUnit(text);
  expect(unit.quantity).toBe(quantity);
  expect(Math.abs(unit.factor / factor - 1)).toBeLessThanOrEqual(2 * Number.EPSILON);
});

describe('a unit that is not known', () => {
  test.each([
    ['Mol', 'mol'],
    ['KPa', 'kPa'],
    ['kpa', 'kPa'],
    ['MG/L', 'mg/L'],
    ['C', 'degC'],
    ['F', 'degF'],
    ['celsius', 'degC'],
    ['deg C', 'degC'],
    ['barr', 'bar'],
    ['J/mol K', 'J/mol/K'],
    ['kmole', 'kmol'],
  ])('%s is answered with %s', (text, suggestion) => {
    expect(messageOf('unit-unknown', () => readUnit(text))).toContain(`(is ${suggestion} meant?)`);
  });

  test.each(['wibble', '', 'quux/L', 'mol/'.repeat(40), '5 mol', 'm^7', 'J//K', 'furlong', 'm/m'])(
    '"%s" is an error',
    (text) => {
      messageOf('unit-unknown', () => readUnit(text));
    },
  );
});
