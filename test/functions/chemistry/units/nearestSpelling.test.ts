import { expect, test } from 'vitest';
import { nearestSpelling } from '../../../../functions/chemistry/units/nearestSpelling.ts';

const KNOWN = ['mol', 'kmol', 'mg/L', 'bar', 'g', 'kPa'];

test.each([
  ['MOL', 'mol'],
  ['mool', 'mol'],
  ['mg/K', 'mg/L'],
  ['bra', null],
  ['barr', 'bar'],
  ['x', null],
  ['wibble', null],
])('%s is nearest to %s', (text, nearest) => {
  expect(nearestSpelling(text, KNOWN)).toBe(nearest);
});
