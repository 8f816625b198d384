/** Addresses of cells and ranges: `B4`, `$A$1:$C$3`, `'Feed tank'!B4`. Rows and columns count from 0. */

/** The size of a sheet in ECMA-376 (Office Open XML), part 1, from memory: A1 to XFD1048576. */
export const MAX_ROWS = 1_048_576;
export const MAX_COLUMNS = 16_384;
/** Longest name of a sheet, in characters; the same standard's programs keep to it, from memory. */
export const MAX_SHEET_NAME = 31;

/** A rectangle of cells, both ends included. */
export interface Area {
  readonly firstRow: number;
  readonly firstColumn: number;
  readonly lastRow: number;
  readonly lastColumn: number;
}

/** A rectangle on a named sheet. */
export interface Reference extends Area {
  readonly sheet: string;
}

/** One end of a range as written in a formula, with its `$` signs. */
export interface WrittenCell {
  readonly row: number;
  readonly column: number;
  readonly isRowFixed: boolean;
  readonly isColumnFixed: boolean;
}

const LETTERS = 26;
const CODE_OF_A = 65;
const WRITTEN_CELL = /^(\$?)([A-Za-z]{1,3})(\$?)0{0,7}([1-9]\d{0,6})$/;
const SHEET_PREFIX = /^(?:'((?:[^']|'')+)'|([\p{L}\p{N}_.]+))!/u;
const PLAIN_SHEET_NAME = /^[A-Za-z_][A-Za-z0-9_]*$/;
const CELL_LIKE = /^(?:[A-Za-z]{1,3}\d+|[Rr]\d*[Cc]\d*)$/;

/** Column 0 is `A`, 26 is `AA`. */
export function columnLetters(column: number): string {
  const last = String.fromCharCode(CODE_OF_A + (column % LETTERS));
  return column < LETTERS ? last : columnLetters(Math.floor(column / LETTERS) - 1) + last;
}

/** The number of a column from its letters, whatever their case; they must be letters. */
export function columnNumber(letters: string): number {
  let column = 0;
  for (const letter of letters.toUpperCase())
    column = column * LETTERS + letter.charCodeAt(0) - CODE_OF_A + 1;
  return column - 1;
}

/** `B4` or `$B$4` with the `$` signs kept; null when it is no cell of a sheet. */
export function readWrittenCell(text: string): WrittenCell | null {
  const match = WRITTEN_CELL.exec(text);
  if (match === null) return null;
  const [, columnSign, letters = '', rowSign, digits] = match;
  const row = Number(digits) - 1;
  const column = columnNumber(letters);
  if (row >= MAX_ROWS || column >= MAX_COLUMNS) return null;
  return { row, column, isRowFixed: rowSign === '$', isColumnFixed: columnSign === '$' };
}

/** `B4` or `B4:C7` without a sheet; the corners may stand in any order. Null when it is neither. */
export function readArea(text: string): Area | null {
  const ends = text.split(':').map(readWrittenCell);
  const [first, last = first] = ends;
  if (ends.length > 2 || !first || !last) return null;
  return {
    firstRow: Math.min(first.row, last.row),
    firstColumn: Math.min(first.column, last.column),
    lastRow: Math.max(first.row, last.row),
    lastColumn: Math.max(first.column, last.column),
  };
}

/** Splits `'Feed tank'!B4` into the sheet's name and the rest; the name is null when none is written. */
export function splitSheet(text: string): { sheet: string | null; rest: string } {
  const match = SHEET_PREFIX.exec(text);
  if (match === null) return { sheet: null, rest: text };
  const [prefix, quoted = '', plain] = match;
  return { sheet: plain ?? quoted.replaceAll("''", "'"), rest: text.slice(prefix.length) };
}

/** `Kettle!B4` or `Kettle!$A$3:$C$7`; null when the sheet is missing or it is no address. */
export function readReference(text: string): Reference | null {
  const { sheet, rest } = splitSheet(text);
  const area = readArea(rest);
  return sheet === null || area === null ? null : { sheet, ...area };
}

/** `B4` */
export function cellName(row: number, column: number): string {
  return `${columnLetters(column)}${row + 1}`;
}

/** `B4`, or `B4:C7` where it is more than one cell. */
export function areaName(area: Area): string {
  const first = cellName(area.firstRow, area.firstColumn);
  return isOneCell(area) ? first : `${first}:${cellName(area.lastRow, area.lastColumn)}`;
}

/** `Kettle!B4` or `Kettle!B4:C7`, the form in which addresses are kept and shown. */
export function referenceName(reference: Reference): string {
  return `${sheetPrefix(reference.sheet)}${areaName(reference)}`;
}

/** `Kettle!$A$3:$C$7`, the form that stays where it is when a formula is filled down. */
export function fixedReferenceName(reference: Reference): string {
  return referenceName(reference).replace(/([A-Z]+)(\d+)(?=:|$)/g, '$$$1$$$2');
}

/** `Kettle!`, or `'Feed tank'!` where the name needs quotes. */
export function sheetPrefix(sheet: string): string {
  const isPlain = PLAIN_SHEET_NAME.test(sheet) && !looksLikeCell(sheet);
  return isPlain ? `${sheet}!` : `'${sheet.replaceAll("'", "''")}'!`;
}

/** Whether a word would be taken for a cell: `K1`, `R1C1`. */
export function looksLikeCell(word: string): boolean {
  return CELL_LIKE.test(word);
}

export function isOneCell(area: Area): boolean {
  return area.firstRow === area.lastRow && area.firstColumn === area.lastColumn;
}

export function rowCount(area: Area): number {
  return area.lastRow - area.firstRow + 1;
}

export function columnCount(area: Area): number {
  return area.lastColumn - area.firstColumn + 1;
}

/** How many cells two rectangles share. */
export function cellsShared(a: Reference, b: Reference): number {
  if (a.sheet !== b.sheet) return 0;
  const rows = Math.min(a.lastRow, b.lastRow) - Math.max(a.firstRow, b.firstRow) + 1;
  const columns = Math.min(a.lastColumn, b.lastColumn) - Math.max(a.firstColumn, b.firstColumn) + 1;
  return Math.max(0, rows) * Math.max(0, columns);
}

export function cellCount(area: Area): number {
  return rowCount(area) * columnCount(area);
}

/** The rectangle from the first cell of one to the last cell of another, on the sheet of the first. */
export function spanned(first: Reference, last: Area): Reference {
  return { ...first, lastRow: last.lastRow, lastColumn: last.lastColumn };
}
