/** Reading the cells of an evaluation: values by place, and what the author wrote beside them. */
import type { Evaluation, Value } from '../evaluation.ts';
import { referenceName, type Reference } from '../workbook/address.ts';

export interface SheetReader {
  readonly valueAt: (sheet: string, row: number, column: number) => Value;
  /** The values of a rectangle, row by row. */
  readonly valuesIn: (area: Reference) => Value[][];
  /** The author's words for a cell: the first of its row, or else the heading above it; empty when none. */
  readonly labelOf: (cell: Reference) => string;
}

export function sheetReader(evaluation: Evaluation): SheetReader {
  const valueAt = (sheet: string, row: number, column: number): Value =>
    evaluation.sheets[sheet]?.[row]?.[column] ?? null;

  /** A typed text; what a formula answers is no label. */
  const wordsAt = (sheet: string, row: number, column: number): string | null => {
    const value = valueAt(sheet, row, column);
    const address = referenceName({
      sheet,
      firstRow: row,
      lastRow: row,
      firstColumn: column,
      lastColumn: column,
    });
    return typeof value === 'string' && !Object.hasOwn(evaluation.formulas, address) ? value : null;
  };

  /** The nearest text above without a gap, after the text right above that: a heading, and its unit. */
  const headingOf = (sheet: string, row: number, column: number): string => {
    let lowest = row - 1;
    while (valueAt(sheet, lowest, column) !== null && wordsAt(sheet, lowest, column) === null) lowest -= 1;
    const words = wordsAt(sheet, lowest, column);
    if (words === null) return '';
    const above = wordsAt(sheet, lowest - 1, column);
    return above === null ? words : `${above}, ${words}`;
  };

  return {
    valueAt,
    valuesIn: ({ sheet, firstRow, lastRow, firstColumn, lastColumn }) =>
      sequence(firstRow, lastRow).map((row) =>
        sequence(firstColumn, lastColumn).map((column) => valueAt(sheet, row, column)),
      ),
    labelOf({ sheet, firstRow, firstColumn }) {
      let words = '';
      let column = firstColumn - 1;
      for (; valueAt(sheet, firstRow, column) !== null; column -= 1) {
        words = wordsAt(sheet, firstRow, column) ?? words;
      }
      return words === '' ? headingOf(sheet, firstRow, firstColumn) : words;
    },
  };
}

function sequence(first: number, last: number): number[] {
  return Array.from({ length: last - first + 1 }, (_, index) => first + index);
}
