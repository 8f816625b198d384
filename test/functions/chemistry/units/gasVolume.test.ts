import { expect, test } from 'vitest';
import { readUnit } from '../../../../functions/chemistry/units/readUnit.ts';
import { messageOf } from '../../raises.ts';

// molar volume of an ideal gas: 22.41396954 L at 0 degC, 1 atm; 22.71095464 at 0 degC, 1 bar
// (CODATA 2018, exact constants cut off after eight decimals, from memory); 23.6448 at 15 degC,
// 1 atm (ISO 13443, from memory); 1 lbmol takes 379.48 scf at 60 degF, 14.696 psi (GPSA, from memory)
test.each([
  ['Nm3(0 degC, 1 atm)', 1000 / 22.41396954, 1e-9],
  ['Nm3(0 degC, 1.01325 bar)', 1000 / 22.41396954, 1e-9],
  ['Nm3(273.15 K, 100 kPa)', 1000 / 22.71095464, 1e-9],
  ['Sm3(15 degC, 101.325 kPa)', 1000 / 23.6448, 5e-6],
  ['scf(60 degF, 14.696 psi)', 453.59237 / 379.48, 2e-5],
])('%s is the amount of ideal gas in it', (text, mol, tolerance) => {
  const unit = readUnit(text);
  expect(unit.quantity).toBe('gas volume');
  // the tolerance is half a unit in the last printed digit of the source
  expect(Math.abs(unit.factor / mol - 1)).toBeLessThan(tolerance);
});

test('one by time is a flow', () => {
  const flow = readUnit('Nm3(0 degC, 1 atm)/h');
  expect(flow).toMatchObject({ text: 'Nm3(0 degC, 1 atm)/h', quantity: 'gas volume flow' });
  expect(flow.factor * 3600).toBeCloseTo(readUnit('Nm3(0 degC, 1 atm)').factor, 12);
});

test.each([
  'Nm3',
  'Nm3/h',
  'Sm3',
  'scf',
  'Nm3(1 bar, 0 degC)',
  'Nm3(0 degC, 0 bar)',
  'Nm3(-300 degC, 1 bar)',
  'Nm3(0 degC, x bar)',
  'Nm3(,)',
])('%s does not say its reference, and choices are listed', (text) => {
  const message = messageOf('unit-reference', () => readUnit(text));
  expect(message).toContain('(0 degC, 1.01325 bar)');
  expect(message).toContain('(0 degC, 1 bar)');
});
