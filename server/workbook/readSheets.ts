import { type InputError, isInputError } from '../../functions/errors.ts';
import { serverError } from '../problems.ts';
import { MAX_SHEET_NAME, cellName, columnCount, rowCount } from './address.ts';
import type { Report } from './fileProblems.ts';
import type { CellContent, Sheet } from './model.ts';
import { comparedName } from './prepareFormula.ts';
import { type Block, readBlock } from './readBlock.ts';
import { shown } from './shown.ts';
import { type PlainValue, isPlainMap } from './yamlValues.ts';

/** Cells of all sheets, blanks between the blocks included; the engine keeps each of them. */
const MAX_CELLS = 200_000;

/** Reads the sheets of a workbook, block by block; what is wrong is reported. */
export function readSheets(sheets: PlainValue | undefined, report: Report): Sheet[] {
  if (!isPlainMap(sheets)) return [];
  let room = MAX_CELLS;
  const names = new Map<string, string>();
  return Object.entries(sheets).map(([name, entries]) => {
    const path = ['sheets', name];
    const sameName = names.get(comparedName(name));
    names.set(comparedName(name), name);
    if (!isSheetName(name)) {
      report(
        serverError('sheet-name', { name: JSON.stringify(shown(name)), limit: MAX_SHEET_NAME }),
        path,
        'key',
      );
    } else if (sameName !== undefined) {
      report(serverError('sheet-name-twice', { first: sameName, second: name }), path, 'key');
    }
    const blocks = readBlocks(name, entries, report);
    const rows = blocks.reduce((most, { area }) => Math.max(most, area.lastRow + 1), 0);
    const columns = blocks.reduce((most, { area }) => Math.max(most, area.lastColumn + 1), 0);
    if (rows * columns > room) {
      const cell = cellName(rows - 1, columns - 1);
      report(
        serverError('sheet-too-large', { sheet: name, cell, cells: rows * columns, limit: MAX_CELLS }),
        path,
        'key',
      );
      return { name, rows: [] };
    }
    room -= rows * columns;
    return { name, rows: layOut(name, blocks, rows, columns, report) };
  });
}

/** Without the characters that ECMA-376 keeps for references, from memory. */
function isSheetName(name: string): boolean {
  return name.length <= MAX_SHEET_NAME && /^(?!['\s])[^:\\/?*[\]\t\n\r]+(?<!['\s])$/.test(name);
}

function readBlocks(sheet: string, entries: PlainValue | undefined, report: Report): Block[] {
  if (!isPlainMap(entries)) return [];
  return Object.entries(entries)
    .map(([address, value]) => readBlock(address, value, ['sheets', sheet, address], report))
    .filter((block) => block !== null);
}

/** Writes the blocks into one rectangle; two that claim the same cell are reported once. */
function layOut(
  sheet: string,
  blocks: readonly Block[],
  rowsInAll: number,
  columnsInAll: number,
  report: Report,
): CellContent[][] {
  const rows = Array.from({ length: rowsInAll }, () => new Array<CellContent>(columnsInAll).fill(null));
  const owners = new Map<number, Block>();
  for (const block of blocks) {
    const error = writeBlock(block, rows, owners, columnsInAll);
    if (error !== null) report(error, ['sheets', sheet, block.address], 'key');
  }
  return rows;
}

function writeBlock(
  block: Block,
  rows: CellContent[][],
  owners: Map<number, Block>,
  columnsInAll: number,
): InputError | null {
  const { firstRow, firstColumn } = block.area;
  for (let row = 0; row < rowCount(block.area); row++) {
    for (let column = 0; column < columnCount(block.area); column++) {
      const place = (firstRow + row) * columnsInAll + firstColumn + column;
      const owner = owners.get(place);
      if (owner !== undefined) {
        const cell = cellName(firstRow + row, firstColumn + column);
        return serverError('block-overlap', { first: owner.address, second: block.address, cell });
      }
      owners.set(place, block);
      try {
        rows[firstRow + row]?.splice(firstColumn + column, 1, block.content(row, column));
      } catch (error) {
        if (!isInputError(error)) throw error;
        return error;
      }
    }
  }
  return null;
}
