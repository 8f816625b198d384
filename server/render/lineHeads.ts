/** What stands before each line of a list of values: the author's words where they surely belong to it. */
import type { Value } from '../evaluation.ts';
import { cellName, columnCount, type Reference } from '../workbook/address.ts';
import type { Page } from './page.ts';
import { referencesOf } from './steps/readingOrder.ts';

/** The first words of tables of amounts and of conditions. */
const HEADINGS: readonly Value[] = ['species', 'quantity'];

/**
 * In this order: the names in the table that an array answer lines up with, labels that tell the
 * lines apart, addresses.
 */
export function lineHeads(page: Page, area: Reference, count: number, isAcross: boolean): string[] {
  const names = isAcross ? null : namesBeside(page, area);
  if (names !== null) return names;
  const cells = Array.from({ length: count }, (_, index) => {
    const row = area.firstRow + (isAcross ? 0 : index);
    const column = area.firstColumn + (isAcross ? index : 0);
    return { ...area, firstRow: row, lastRow: row, firstColumn: column, lastColumn: column };
  });
  const labels = cells.map(page.cells.labelOf);
  const isTelling = new Set(labels).size === count && !labels.includes('');
  return isTelling ? labels : cells.map(({ firstRow, firstColumn }) => cellName(firstRow, firstColumn));
}

/**
 * The names of a table that the array answer reads and stands beside, row against row. Null unless
 * both have the same rows, apart from the table's heading: a name must never stand at a wrong number.
 */
function namesBeside(page: Page, area: Reference): string[] | null {
  const formula = page.calculation
    .stepsIn(area)
    .flatMap(({ formulas }) => formulas)
    .find(({ fills }) => fills.firstRow === area.firstRow && fills.lastRow === area.lastRow);
  for (const table of referencesOf(formula?.formula.comesFrom ?? [])) {
    if (table.sheet !== area.sheet || columnCount(table) === 1) continue;
    const first = page.cells.valueAt(table.sheet, table.firstRow, table.firstColumn);
    const firstRow = table.firstRow + (HEADINGS.includes(first) ? 1 : 0);
    if (firstRow !== area.firstRow || table.lastRow !== area.lastRow) continue;
    const names = page.cells.valuesIn({ ...table, firstRow }).map(([name]) => name ?? null);
    if (names.every((name) => typeof name === 'string')) return names;
  }
  return null;
}
