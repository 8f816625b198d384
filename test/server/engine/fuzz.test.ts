import { expect, it } from 'vitest';
import { hostOf } from './hostOf.ts';
import { fuzzFormulas } from './fuzz.ts';

it('2,000 formulas made at random stay inside the host', () => fuzzFormulas(2000, 20261201), 60_000);

/** Each is understood by nobody, and each must say so instead of giving a number. */
const NOT_UNDERSTOOD = [
  'EXTENT.SOLVE("A + B = 2 C", 4, {1;1;0}, A1:B1)',
  'EXTENT.SOLVE("A + B = 2 C", 4, {1;1})',
  'EXTENT.SOLVE("A + B = 2 C", "four", {1;1;0})',
  'EXTENT.SOLVE("A + B = 2 C", TRUE, {1;1;0})',
  'EXTENT.SOLVE("A + B = 2 C", A9, {1;1;0})',
  'EXTENT.SOLVE("A + B = 2 C", 4, {1;"1";0})',
  'EXTENT.SOLVE("A + B = 2 C", -4, {1;1;0})',
  'EXTENT.SOLVE("A + B == 2 C", 4, {1;1;0})',
  'REACTION.QUOTIENT("2 H2(g) + O2(g) = 2 H2O(g)", {1;1;1})',
  'UNITS.CONVERT(1, "kg", "furlong")',
  'UNITS.CONVERT("1", "kg", "g")',
  'UNITS.CONVERT(, "kg", "g")',
  'K.FROM.GIBBS(1, -5)',
];

it.each(NOT_UNDERSTOOD)('%s is an error', (formula) => {
  const host = hostOf({ A1: 'presure', B1: 5, D1: `=${formula}` });
  expect(host.values('S!D1')).toHaveProperty('error');
});
