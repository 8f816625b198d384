/** Answers that a cell cannot hold are errors that say so, never infinite and never a silent 0. */
import { describe, expect, it } from 'vitest';
import { messageFrom, numberOf } from './asking.ts';

describe('an answer beyond what a cell can hold', () => {
  it.each([
    ['quotient-too-large', '=REACTION.QUOTIENT("3 A = 3 B", {1E-150;1E150})', 'ln Q is 2072'],
    ['quotient-too-large', '=REACTION.QUOTIENT("3 A = 3 B", {1E150;1E-150})', 'ln Q is -2072'],
    ['constant-too-large', '=K.VANTHOFF(1, 300, -3000, 30)', 'ln K is 10824'],
    ['constant-too-large', '=K.VANTHOFF(1, 300, 3000, 30)', 'ln K is -10824'],
    ['constant-too-large', '=K.FROM.GIBBS(-100000, 300)', 'ln K is 40090'],
    ['argument-kind', '=UNITS.CONVERT(1E308, "t", "mg")', 'a number that a cell can hold in mg'],
  ])('is the error %s for %s', (code, formula, names) => {
    expect(messageFrom(code, formula)).toContain(names);
  });

  it('has a logarithm all the same', () => {
    const found = numberOf('=REACTION.REDUCED.AFFINITY("3 A = 3 B", 1, {1E-150;1E150})');
    expect(Math.abs(found / (-900 * Math.LN10) - 1)).toBeLessThan(1e-14);
  });
});
