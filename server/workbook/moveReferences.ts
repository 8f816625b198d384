import { serverError } from '../problems.ts';
import { MAX_COLUMNS, MAX_ROWS, columnLetters, columnNumber, splitSheet } from './address.ts';
import { type Token, formulaTokens } from './formulaTokens.ts';

/** Gives the formula as it reads so many rows down and columns to the right, in `cell`. */
export type Filler = (rows: number, columns: number, cell: string) => string;

/**
 * The formula as it reads when it is filled from one cell into another, `rows` down and `columns` to
 * the right: relative references move, those with `$` stay. The rest of the text is left alone.
 *
 * @throws `fill-off-sheet` when a reference would leave the sheet; `cell` is the cell filled.
 */
export function moveReferences(formula: string, rows: number, columns: number, cell: string): string {
  return fillerOf(formula)(rows, columns, cell);
}

/** `moveReferences` for many cells: the formula is cut into tokens once. */
export function fillerOf(formula: string): Filler {
  const tokens = formulaTokens(formula);
  return (rows, columns, cell) => {
    if (rows === 0 && columns === 0) return formula;
    return tokens.map((token) => movedToken(token, rows, columns) ?? offSheet(token, cell)).join('');
  };
}

function offSheet({ text }: Token, cell: string): never {
  throw serverError('fill-off-sheet', { cell, reference: text });
}

/** One end of a reference: a `$` or not, letters or none, a `$` or not, digits or none. */
const END = /^(\$?)([A-Za-z]*)(\$?)(\d*)$/;

function movedToken({ kind, text }: Token, rows: number, columns: number): string | null {
  if (kind !== 'cell' && kind !== 'columns' && kind !== 'rows') return text;
  const { rest } = splitSheet(text);
  const prefix = text.slice(0, text.length - rest.length);
  const ends = rest.split(':').map((end) => movedEnd(end, rows, columns));
  return ends.includes(null) ? null : prefix + ends.join(':');
}

function movedEnd(end: string, rows: number, columns: number): string | null {
  const [, firstSign = '', letters = '', secondSign = '', digits = ''] = END.exec(end) ?? [];
  const rowSign = letters === '' ? firstSign : secondSign;
  const columnSign = letters === '' ? '' : firstSign;
  const movedLetters = letters === '' || columnSign === '$' ? letters : movedColumn(letters, columns);
  const movedDigits = digits === '' || rowSign === '$' ? digits : movedRow(digits, rows);
  if (movedLetters === null || movedDigits === null) return null;
  return `${columnSign}${movedLetters}${rowSign}${movedDigits}`;
}

function movedColumn(letters: string, columns: number): string | null {
  const column = columnNumber(letters) + columns;
  if (column < 0 || column >= MAX_COLUMNS) return null;
  const moved = columnLetters(column);
  return letters === letters.toLowerCase() ? moved.toLowerCase() : moved;
}

function movedRow(digits: string, rows: number): string | null {
  const row = Number(digits) + rows;
  return row < 1 || row > MAX_ROWS ? null : String(row);
}
