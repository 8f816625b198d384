import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  alignedNumber,
  numberMarkup,
  numberText,
  roundedText,
  tailWidth,
} from '../../../server/render/numberText.ts';

test.each([
  [0, '0'],
  [-0, '0'],
  [101325, '101325'],
  [1234567, '1234567'],
  [1234567.8, '1.23457e6'],
  [1.5194981509883698, '1.5195'],
  [-24.3583, '-24.3583'],
  [0.000123456789, '0.000123457'],
  [0.0000123456789, '1.23457e-5'],
  [5.925e-28, '5.925e-28'],
  [9.9999999, '10'],
  [999999.9, '1e6'],
  [1e300, '1e300'],
])('without declared digits %s is shown as %s', (value, shown) => {
  expect(numberText(value)).toBe(shown);
});

test.each([
  [2, 4, '2.000'],
  [0.012, 3, '0.0120'],
  [18.738921, 4, '18.74'],
  [9.9996, 4, '10.00'],
  [101325, 3, '1.01e5'],
  [5.925e-28, 2, '5.9e-28'],
  [0, 3, '0.00'],
])('%s with %i declared digits is shown as %s', (value, digits, shown) => {
  expect(numberText(value, digits)).toBe(shown);
});

test('what is shown has the declared precision', () => {
  fc.assert(
    fc.property(
      fc.double({ noNaN: true, min: -1e307, max: 1e307 }),
      fc.integer({ min: 1, max: 15 }),
      (value, digits) => {
        // rounding to so many digits moves a number by half a unit of the last of them, at most; subnormal
        // numbers have fewer digits to show, and reading back rounds by 2^-53
        const half = 0.5 * 10 ** (1 - digits) + 2 ** -50;
        const allowed = Math.max(Math.abs(value) * half, Number.MIN_VALUE);
        expect(Math.abs(Number(numberText(value, digits)) - value)).toBeLessThanOrEqual(allowed);
      },
    ),
    { seed: 20261201, numRuns: 500 },
  );
});

test('the exact value stands in title where what is shown is rounded, and in value always', () => {
  expect(numberMarkup(1 / 3).markup).toBe(
    '<data value="0.3333333333333333" title="0.3333333333333333">0.333333</data>',
  );
  expect(numberMarkup(0.25).markup).toBe('<data value="0.25" >0.25</data>');
});

test('a power of ten is typeset', () => {
  expect(numberMarkup(5.925e-28).markup).toContain('5.925&#215;10<sup>\u221228</sup>');
});

test('decimal points align: all tails of a column are equally wide', () => {
  const values = [12.5, 3, 0.125];
  const width = tailWidth(values);
  expect(width).toBe('.125'.length);
  for (const value of values) expect(alignedNumber(value, width).markup).toContain(`min-width:${width}ch`);
});

test('a rounded label has no zeros that only fill it', () => {
  expect([roundedText(2, 4), roundedText(1.41099, 4), roundedText(-8.74034, 4)]).toEqual([
    '2',
    '1.411',
    '-8.74',
  ]);
});
