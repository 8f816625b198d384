import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  add,
  divide,
  multiply,
  printDecimal,
  printRational,
  rational,
  readRational,
  subtract,
  toNumber,
} from '../../../functions/chemistry/rational.ts';

const fractions = fc
  .tuple(fc.bigInt({ min: -99999n, max: 99999n }), fc.bigInt({ min: 1n, max: 9999n }))
  .map(([numerator, denominator]) => rational(numerator, denominator));

test.each([
  ['2', 2n, 1n],
  ['0.5', 1n, 2n],
  ['1/2', 1n, 2n],
  ['0.947', 947n, 1000n],
  ['1.5/4.5', 1n, 3n],
])('%s is read exactly', (text, numerator, denominator) => {
  expect(readRational(text)).toEqual({ numerator, denominator });
});

test('a third of three thirds is one, which decimals cannot say', () => {
  const third = readRational('1/3');
  expect(add(third, add(third, third))).toEqual(rational(1n));
  expect(subtract(rational(1n), multiply(rational(3n), readRational('0.333333')))).not.toEqual(rational(0n));
});

test('what is divided comes back when it is multiplied', () => {
  fc.assert(
    fc.property(fractions, fractions, (a, b) => {
      fc.pre(b.numerator !== 0n);
      expect(multiply(divide(a, b), b)).toEqual(a);
    }),
    { seed: 11 },
  );
});

test('the printed text of a positive fraction reads back as the same', () => {
  fc.assert(
    fc.property(fractions, (a) => {
      fc.pre(a.numerator > 0n);
      expect(readRational(printRational(a))).toEqual(a);
    }),
    { seed: 12 },
  );
});

test('halves to eighths are printed as fractions, others as decimals where these end', () => {
  expect(
    ['1/2', '5/3', '0.125', '0.947', '0.1', '1/9', '12'].map((text) => printRational(readRational(text))),
  ).toEqual(['1/2', '5/3', '1/8', '0.947', '0.1', '1/9', '12']);
});

test('decimals that do not end have no decimal text, negative ones keep their sign', () => {
  expect(printDecimal(rational(1n, 3n))).toBeNull();
  expect(printDecimal(rational(-1n, 40n))).toBe('-0.025');
});

test('the number is the nearest one', () => {
  expect(toNumber(readRational('0.947'))).toBe(0.947);
  expect(toNumber(rational(1n, 3n))).toBe(1 / 3);
});
