import fc from 'fast-check';
import { expect, test } from 'vitest';
import { convertDifference, convertValue } from '../../../../functions/chemistry/units/convert.ts';
import { readUnit } from '../../../../functions/chemistry/units/readUnit.ts';
import { TRADE_UNITS } from '../../../../functions/chemistry/units/tradeUnits.ts';
import { messageOf } from '../../raises.ts';

const convert = (value: number, from: string, to: string) =>
  convertValue(value, readUnit(from), readUnit(to));

// by definition of the units, exact
test.each([
  [1, 'atm', 'torr', 760],
  [1, 'atm', 'bar', 1.01325],
  [1, 'atm', 'Pa', 101325],
  [25, 'degC', 'K', 298.15],
  [298.15, 'K', 'degC', 25],
  [32, 'degF', 'degC', 0],
  [36, 'kmol/h', 'mol/s', 10],
  [1, 'kmol/h', 'kmol/d', 24],
  [1, 'kcal', 'kJ', 4.184],
  [1, 'kcal/mol', 'kJ/mol', 4.184],
  [0.25, 'mol/mol', 'mol %', 25],
  [400, 'ppm', '%', 0.04],
  [3, 'mmol/L', 'mol/m3', 3],
  [2, 'MPa', 'bar', 20],
  [1, 'lbmol', 'kmol', 0.45359237],
  [1, 'kg/m^3', 'g/L', 1],
  [1, 'W/m^2', 'kW/m^2', 0.001],
])('%d %s is %s %s', (value, from, to, expected) => {
  expect(convert(value, from, to)).toBe(expected);
});

test('212 degF is 100 degC, to the rounding of the 373 K between them', () => {
  // two roundings of half a unit in the last place of 373.15
  expect(Math.abs(convert(212, 'degF', 'degC') - 100)).toBeLessThanOrEqual(373.15 * Number.EPSILON);
});

// NIST SP 811, appendix B, seven printed digits (from memory): half a unit in the last
test.each([
  [1, 'psi', 'kPa', 6.894757, 5e-7],
  [1, 'mmHg', 'Pa', 133.3224, 5e-5],
  [1, 'torr', 'Pa', 133.3224, 5e-5],
  [1, 'inHg', 'kPa', 3.386389, 5e-7],
  [1, 'lb/ft^3', 'kg/m3', 16.01846, 5e-6],
  [1, 'Btu', 'kJ', 1.055056, 5e-7],
])('%d %s is %s %d, to the printed digits', (value, from, to, printed, tolerance) => {
  expect(Math.abs(convert(value, from, to) - printed)).toBeLessThanOrEqual(tolerance);
});

test('torr and mmHg differ by 1.4e-7, as their definitions do', () => {
  expect(convert(1, 'mmHg', 'torr') - 1).toBeCloseTo(1.4247e-7, 11);
});

test('an uncertainty converts as a difference', () => {
  expect(convertDifference(2, readUnit('degC'), readUnit('K'))).toBe(2);
  expect(convertDifference(9, readUnit('degF'), readUnit('degC'))).toBe(5);
  expect(convertDifference(0.5, readUnit('%'), readUnit('ppm'))).toBe(5000);
});

test('a gas volume converts to the amount of ideal gas in it, and to another reference', () => {
  expect(convert(1, 'Nm3(0 degC, 1 atm)', 'mol')).toBe(readUnit('Nm3(0 degC, 1 atm)').factor);
  expect(convert(1, 'Nm3(0 degC, 1 atm)', 'Nm3(15 degC, 1 atm)')).toBeCloseTo(288.15 / 273.15, 14);
});

test('a concentration as CaCO3 is one of charges', () => {
  // M(CaCO3)/2 = 50.043 g/mol
  expect(convert(50.043, 'mg/L as CaCO3', 'meq/L')).toBeCloseTo(1, 14);
});

test.each([
  ['bar', 'K', 'bar (pressure) cannot be converted to K (temperature)'],
  ['bar', 'bar gauge', 'gauge pressure'],
  ['mol', 'kg', 'mass'],
  ['%', 'mol %', 'amount fraction'],
  ['mg/L', 'mg/L as N', 'mass concentration as N'],
  ['mg/L as P', 'mg/L as N', 'mass concentration as P'],
  ['W/m^2', 'W/m', 'another quantity'],
  ['1', 'mol', 'a pure number'],
])('%s and %s are of different quantities, and both are named', (from, to, words) => {
  expect(messageOf('unit-incompatible', () => convert(1, from, to))).toContain(words);
});

test('a value survives the way there and back to its last digits, between any two units of a quantity', () => {
  const units = [...new Set(TRADE_UNITS.values())];
  const pairs = units.flatMap((a) =>
    units.filter((b) => a.quantity === b.quantity).map((b) => [a, b] as const),
  );
  fc.assert(
    fc.property(fc.constantFrom(...pairs), fc.double({ min: 1, max: 1000, noNaN: true }), ([a, b], value) => {
      const back = convertValue(convertValue(value, a, b), b, a);
      // each way has four roundings of half a unit, in numbers no larger than the value and the zeros
      const largest =
        value + a.zero + (b.zero * (b.numerator * a.denominator)) / (b.denominator * a.numerator);
      expect(Math.abs(back - value)).toBeLessThanOrEqual(4 * Number.EPSILON * largest);
    }),
    { seed: 71, numRuns: 2000 },
  );
});

test('a value in its own unit is itself', () => {
  for (const unit of TRADE_UNITS.values()) expect(convertValue(0.1, unit, unit)).toBe(0.1);
});
