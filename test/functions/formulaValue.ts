/**
 * What a formula gives in a workbook of its own: the way a person meets a cell function.
 */
import type { CellScalar, CellTable } from '../../functions/cells/entry.ts';
import { Host } from '../../server/engine/host.ts';
import type { Value } from '../../server/evaluation.ts';
import { readArea } from '../../server/workbook/address.ts';
import type { CellContent, Workbook } from '../../server/workbook/model.ts';

/** Far enough from any block of an example that an array answer has room. */
const FORMULA_CELL = 'AA1';

/** The value, the rectangle or the error of a formula beside these blocks of cells. */
export function formulaValue(
  formula: string,
  blocks: Readonly<Record<string, CellTable>> = {},
): Value | Value[][] {
  const host = new Host(workbookOf(formula, blocks), { instant: '2026-01-01T00:00:00Z' });
  const { formulas } = host.evaluate();
  const last = formulas[`Sheet!${FORMULA_CELL}`]!.lastCell ?? `Sheet!${FORMULA_CELL}`;
  return host.values(`Sheet!${FORMULA_CELL}:${last.slice('Sheet!'.length)}`);
}

/** A workbook with one sheet named Sheet that holds the blocks and the formula in AA1. */
function workbookOf(formula: string, blocks: Readonly<Record<string, CellTable>> = {}): Workbook {
  const grid: CellContent[][] = [];
  const put = (row: number, column: number, content: CellContent) => {
    (grid[row] ??= [])[column] = content;
  };
  for (const [anchor, cells] of Object.entries(blocks)) {
    const { firstRow, firstColumn } = readArea(anchor)!;
    cells.forEach((line, r) => line.forEach((cell, c) => put(firstRow + r, firstColumn + c, content(cell))));
  }
  const { firstRow, firstColumn } = readArea(FORMULA_CELL)!;
  put(firstRow, firstColumn, { formula });
  const width = firstColumn + 1;
  const rows = Array.from(grid, (line: CellContent[] | undefined = []) =>
    Array.from({ length: width }, (_, c) => line[c] ?? null),
  );
  return {
    title: '',
    about: '',
    file: 'example',
    sha256: '',
    names: {},
    sheets: [{ name: 'Sheet', rows }],
    inputs: [],
    outputs: [],
    checks: [],
    arrayArithmetic: true,
  };
}

function content(cell: CellScalar): CellContent {
  return typeof cell === 'string' ? { text: cell } : cell;
}
