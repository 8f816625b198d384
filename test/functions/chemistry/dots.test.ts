import { expect, test } from 'vitest';
import { tellDotsApart } from '../../../functions/chemistry/dots.ts';
import { messageOf } from '../raises.ts';

test.each([
  ['CuSO4.5H2O', 'CuSO4·5H2O'],
  ['Al2(SO4)3.18H2O', 'Al2(SO4)3·18H2O'],
  ['CaSO4.0.5H2O', 'CaSO4·0.5H2O'],
  ['Ca(OH)2.H2O', 'Ca(OH)2·H2O'],
  ['NaCl.2H2O', 'NaCl·2H2O'],
  ['K2CO3.1.5H2O', null],
])('before water %s reads as %s', (text, read) => {
  if (read === null)
    expect(messageOf('formula-two-readings', () => tellDotsApart(text))).toContain('K2CO3·1.5H2O');
  else expect(tellDotsApart(text)).toBe(read);
});

test.each([
  'Fe0.947O',
  'Fe0.5H2O',
  'UO2.67',
  'YBa2Cu3O6.9',
  'La1.85Sr0.15CuO4',
  'La0.8Sr0.2MnO3',
  'Fe1.05O',
  'UO2.5·H2O',
])('%s has decimals', (text) => {
  expect(tellDotsApart(text)).toBe(text);
});

test.each([
  ['MgCl2.6NH3', 'as MgCl2·6NH3 or as MgCl2.60NH3'],
  ['UO2.5.2H2O', 'as UO2·5.2H2O or as UO2.5·2H2O'],
])('%s has two readings, and both are shown', (text, readings) => {
  expect(messageOf('formula-two-readings', () => tellDotsApart(text))).toContain(readings);
});

test('H2O2 is no water', () => {
  expect(messageOf('formula-two-readings', () => tellDotsApart('CO2.3H2O2'))).toContain('CO2·3H2O2');
});
