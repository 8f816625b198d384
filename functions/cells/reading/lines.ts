/**
 * How a labelled table lies: down, one row for each species, or across, one column for each.
 */
import type { CellScalar, CellTable, Shape } from '../entry.ts';

/** A labelled table has at most a species, an amount, a unit and an uncertainty. */
export const WIDEST_LINE = 4;

export interface TableLines {
  readonly lies: 'down' | 'across';
  /** One line for each species, the heading included. */
  readonly lines: readonly (readonly CellScalar[])[];
}

/**
 * The lines of a labelled table.
 *
 * It lies across when its first row holds only texts and its second row only numbers beneath them
 * (or the headings `species` and `amount` stand one under the other); otherwise it lies down.
 */
export function tableLines(table: CellTable): TableLines {
  if (!liesAcross(table)) return { lies: 'down', lines: table };
  const lines = table[0]!.map((_, column) => table.map((row) => row[column]!));
  return { lies: 'across', lines };
}

function liesAcross(table: CellTable): boolean {
  const [first, second] = table;
  if (second === undefined || table.length > WIDEST_LINE || typeof first![1] === 'number') return false;
  const start = isHeadingWord(first![0]!, 'species') ? 1 : 0;
  if (start === 1 && !isHeadingWord(second[0]!, 'amount')) return false;
  let numbers = 0;
  for (let column = start; column < first!.length; column++) {
    const label = first![column];
    const amount = second[column];
    if (label === null && amount === null) continue;
    if (typeof label !== 'string' || typeof amount === 'string') return false;
    if (typeof amount === 'number') numbers++;
  }
  return numbers > 0;
}

/** Whether the cell is a text that begins with this word. */
export function isHeadingWord(cell: CellScalar, word: string): boolean {
  return typeof cell === 'string' && cell.trimStart().toLowerCase().startsWith(word);
}

/**
 * The size of an answer that lines up with a table of this size: one cell for each of its lines.
 *
 * From the size alone a table of up to four rows and up to four columns is taken to lie down.
 */
export function alignedShape({ rows, columns, lies }: Shape): Shape {
  const isAcross =
    lies === undefined ? rows === 1 || (rows <= WIDEST_LINE && columns > WIDEST_LINE) : lies === 'across';
  return isAcross ? { rows: 1, columns } : { rows, columns: 1 };
}
