import { expect, test } from 'vitest';
import { plainNotation } from '../../../functions/chemistry/notation.ts';

test.each([
  ['SO₄²⁻', 'SO4^2-'],
  ['Ca²⁺', 'Ca^2+'],
  ['Na⁺', 'Na^+'],
  ['Ca^²⁺', 'Ca^2+'],
  ['¹³C', '^13C'],
  ['C₆H₁₂', 'C6H12'],
  ['Cl−', 'Cl-'],
  ['CuSO4•5H2O', 'CuSO4·5H2O'],
  ['  a \t b\n', 'a b'],
])('%s is %s in plain notation', (pasted, plain) => {
  expect(plainNotation(pasted)).toBe(plain);
});
