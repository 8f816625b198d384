import { serverError } from '../problems.ts';
import { type Area, MAX_COLUMNS, MAX_ROWS, cellName, isOneCell, readArea } from './address.ts';
import { BLOCK_ADDRESS } from './documentSchema.ts';
import type { Path, Report } from './fileProblems.ts';
import type { CellContent } from './model.ts';
import { fillerOf } from './moveReferences.ts';
import { shown } from './shown.ts';
import type { PlainValue } from './yamlValues.ts';

/** What an address of a sheet is given: the cells it covers and what each holds. */
export interface Block {
  /** The key in the file. */
  readonly address: string;
  readonly area: Area;
  /** Content of the cell so many rows down and columns to the right of the first. */
  readonly content: (row: number, column: number) => CellContent;
}

/** Reads `A3: value`, `A3: rows of values` or `G4:G7: formula`; null when it cannot, which is reported. */
export function readBlock(address: string, value: PlainValue, path: Path, report: Report): Block | null {
  const area = BLOCK_ADDRESS.test(address) ? readArea(address) : null;
  if (area === null) {
    report(serverError('sheet-address', { address: shown(address) }), path, 'key');
    return null;
  }
  if (value === null) {
    report(serverError('cell-empty', { address }), path, 'key');
    return null;
  }
  if (!Array.isArray(value)) return filledArea(address, area, readCell(value, path, report));
  if (address.includes(':')) {
    const first = cellName(area.firstRow, area.firstColumn);
    report(serverError('block-in-range', { address, first }), path);
    return null;
  }
  return rowsFrom(address, area, value, path, report);
}

function filledArea(address: string, area: Area, content: CellContent | undefined): Block | null {
  if (content === undefined) return null;
  if (content === null || typeof content !== 'object' || !('formula' in content) || isOneCell(area)) {
    return { address, area, content: () => content };
  }
  const fill = fillerOf(content.formula);
  return {
    address,
    area,
    content: (row, column) => {
      const cell = cellName(area.firstRow + row, area.firstColumn + column);
      return { formula: fill(row, column, cell) };
    },
  };
}

function rowsFrom(
  address: string,
  { firstRow, firstColumn }: Area,
  values: readonly PlainValue[],
  path: Path,
  report: Report,
): Block | null {
  const rows: CellContent[][] = [];
  const width = Array.isArray(values[0]) ? values[0].length : 0;
  for (const [index, items] of values.entries()) {
    const row = index + 1;
    if (!Array.isArray(items)) {
      report(serverError('block-rows', { address, row }), [...path, index]);
      return null;
    }
    if (items.length > width) {
      const details = { address, row, found: items.length, expected: width };
      report(serverError('block-row-too-long', details), [...path, index]);
    }
    rows.push(items.map((item, column) => readCell(item, [...path, index, column], report) ?? null));
  }
  if (width === 0) {
    report(serverError('cell-empty', { address }), path, 'key');
    return null;
  }
  const area = {
    firstRow,
    firstColumn,
    lastRow: firstRow + rows.length - 1,
    lastColumn: firstColumn + width - 1,
  };
  if (area.lastRow >= MAX_ROWS || area.lastColumn >= MAX_COLUMNS) {
    report(serverError('block-off-sheet', { address }), path, 'key');
    return null;
  }
  return { address, area, content: (row, column) => rows[row]?.[column] ?? null };
}

/** One cell; undefined when it is none. A text without letters is a blank. */
function readCell(value: PlainValue, path: Path, report: Report): CellContent | undefined {
  if (typeof value === 'string') {
    if (value.startsWith('=')) return { formula: value.trimEnd() };
    return value === '' ? null : { text: value };
  }
  if (typeof value !== 'object' || value === null) return value;
  const keys = Object.keys(value);
  if (!Array.isArray(value) && keys.length === 1 && typeof value.text === 'string') {
    return { text: value.text };
  }
  const where = Array.isArray(value) ? 'a list inside a row' : `the entry ${shown(keys[0] ?? '{}')}`;
  report(serverError('cell-mapping', { where }), path);
  return undefined;
}
