import { describe, expect, it } from 'vitest';
import { typedValue } from '../../server/givenText.ts';

describe('a typed value', () => {
  it.each([
    ['1.5', 1.5],
    [' -2e-3 ', -0.002],
    ['+.5', 0.5],
    ['3.', 3],
    ['true', true],
    ['FALSE', false],
  ])('%j is a number or a truth value', (text, value) => {
    expect(typedValue(text)).toBe(value);
  });

  it.each(['', ' ', '=1+1', '1,5', '1e999', '0x10', 'Infinity', 'NaN', '1_000', '.', 'e5', '1/2', ' text '])(
    '%j stays a text',
    (text) => {
      expect(typedValue(text)).toBe(text);
    },
  );
});
