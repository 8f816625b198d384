/**
 * Published figures, checked through a formula cell.
 */
import { expect, it } from 'vitest';
import type { CellTable } from '../../functions/cells/entry.ts';
import { formulaValue } from '../functions/formulaValue.ts';

/** One printed figure: what it is, where it is printed, and the formula that is to give it. */
export interface Figure {
  readonly is: string;
  readonly source: string;
  readonly formula: string;
  readonly cells?: Readonly<Record<string, CellTable>>;
  readonly printed: number;
  /** Half a unit of the last printed digit, unless the note beside it says why not. */
  readonly within: number;
}

/** A test for each figure, named by what it is and where it is printed. */
export function testFigures(figures: readonly Figure[]): void {
  it.each(figures)('$is: $printed ($source)', ({ formula, cells, printed, within }) => {
    const found = formulaValue(formula, cells);
    expect(found, 'not a number').toBeTypeOf('number');
    expect(Math.abs((found as number) - printed)).toBeLessThanOrEqual(within);
  });
}
