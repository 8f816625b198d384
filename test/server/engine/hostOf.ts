/** A host of one sheet named S, from cells by address. A text that begins with = is a formula. */
import { Host } from '../../../server/engine/host.ts';
import { readArea } from '../../../server/workbook/address.ts';
import type { CellContent, Workbook } from '../../../server/workbook/model.ts';

export const INSTANT = '2026-03-01T06:00:00Z';

type Typed = number | string | boolean;

export function hostOf(cells: Readonly<Record<string, Typed>>, changes: Partial<Workbook> = {}): Host {
  return new Host(workbookWith(cells, changes), { instant: INSTANT });
}

export function workbookWith(
  cells: Readonly<Record<string, Typed>>,
  changes: Partial<Workbook> = {},
): Workbook {
  const grid: CellContent[][] = [];
  let width = 0;
  for (const [address, typed] of Object.entries(cells)) {
    const { firstRow, firstColumn } = readArea(address)!;
    (grid[firstRow] ??= [])[firstColumn] = contentOf(typed);
    width = Math.max(width, firstColumn + 1);
  }
  const rows = Array.from(grid, (line: CellContent[] | undefined = []) =>
    Array.from({ length: width }, (_, c) => line[c] ?? null),
  );
  return {
    title: '',
    about: '',
    file: 'case.yaml',
    sha256: '',
    names: {},
    sheets: [{ name: 'S', rows }],
    inputs: [],
    outputs: [],
    checks: [],
    arrayArithmetic: true,
    ...changes,
  };
}

function contentOf(typed: Typed): CellContent {
  if (typeof typed !== 'string') return typed;
  return typed.startsWith('=') ? { formula: typed } : { text: typed };
}
