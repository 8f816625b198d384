import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { moveReferences } from '../../../server/workbook/moveReferences.ts';
import { formulaLike } from './formulaText.ts';

describe('a formula that is filled', () => {
  it.each([
    ['=B4/SUM(B$4:B$7)', 1, 0, '=B5/SUM(B$4:B$7)'],
    ['=B4/SUM(B$4:B$7)', 0, 1, '=C4/SUM(C$4:C$7)'],
    ['=$A1+a$1+Kettle!B2', 2, 1, '=$A3+b$1+Kettle!C4'],
    ['=\'Feed tank\'!B2&"B2"', 1, 1, '=\'Feed tank\'!C3&"B2"'],
    ['=SUM(A:A)+SUM($A:B)+SUM(1:$2)', 1, 1, '=SUM(B:B)+SUM($A:C)+SUM(2:$2)'],
    ['=LOG10(B2)+charge+1e5+Z1', 1, 1, '=LOG10(C3)+charge+1e5+AA2'],
    ["='B2 list'!B2+B2_x", 1, 1, "='B2 list'!C3+B2_x"],
  ])('%s moved by %d, %d reads %s', (formula, rows, columns, moved) => {
    expect(moveReferences(formula, rows, columns, 'G5')).toBe(moved);
  });

  it.each([
    ['=A1', -1, 0],
    ['=A1', 0, -1],
    ['=XFD1', 0, 1],
    ['=A1048576', 1, 0],
    ['=SUM(A:B)', 0, -1],
    ['=SUM(1:2)', -1, 0],
  ])('%s is refused when moving by %d, %d leaves the sheet', (formula, rows, columns) => {
    expect(() => moveReferences(formula, rows, columns, 'G5')).toThrow(
      expect.objectContaining({ code: 'fill-off-sheet' }),
    );
  });

  it('reads as before when it is moved back', () => {
    const step = fc.integer({ min: -3, max: 3 });
    let moved = 0;
    fc.assert(
      fc.property(formulaLike, step, step, (formula, rows, columns) => {
        // Mixed capitals and leading zeros of an address are not kept.
        const plain = formula.replace(/[a-z]/g, (letter) => letter.toUpperCase()).replace(/0/g, '1');
        try {
          const there = moveReferences(plain, rows, columns, 'G5');
          expect(moveReferences(there, -rows, -columns, 'G5')).toBe(plain);
          moved += 1;
        } catch (error) {
          expect(error).toMatchObject({ code: 'fill-off-sheet' });
        }
      }),
      { seed: 3, numRuns: 1000 },
    );
    expect(moved).toBeGreaterThan(200);
  });
});
