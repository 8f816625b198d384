import { expect, test } from 'vitest';
import {
  GAS_CONSTANT,
  GAS_CONSTANT_L_BAR,
  STANDARD_ATMOSPHERE_BAR,
  ZERO_CELSIUS_K,
} from '../../../functions/data/constants.ts';

test('the gas constant is the product of the two exact constants of the SI', () => {
  // 1.380649e-23 x 6.02214076e23 = 1380649 x 602214076 / 1e14, in whole numbers
  const exact = 1380649n * 602214076n;
  expect(exact).toBe(831446261815324n);
  expect(GAS_CONSTANT).toBe(Number(exact) / 1e14);
  expect(GAS_CONSTANT_L_BAR).toBe(Number(exact) / 1e16);
});

test('an ideal gas takes 22.41396954... L/mol at 0 degC and 1 atm (CODATA 2018, from memory)', () => {
  const litres = (GAS_CONSTANT_L_BAR * ZERO_CELSIUS_K) / STANDARD_ATMOSPHERE_BAR;
  // an exact constant, printed cut off after eight decimals and not rounded
  expect(Math.floor(litres * 1e8)).toBe(2241396954);
});
