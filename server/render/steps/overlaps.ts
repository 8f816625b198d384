/** Which rectangles of cells a reference meets, without visiting every cell of a large range. */
import { cellCount, cellName, cellsShared, columnCount, type Reference } from '../../workbook/address.ts';

export interface Filling {
  readonly fills: Reference;
}

/** The items that share a cell with a reference, in their own order. No two items share a cell. */
export type Meeting<Item extends Filling> = (reference: Reference) => Item[];

export function meeting<Item extends Filling>(items: readonly Item[]): Meeting<Item> {
  const order = new Map(items.map((item, index) => [item, index]));
  const byCell = new Map<string, Item>();
  for (const item of items) for (const cell of cellKeys(item.fills)) byCell.set(cell, item);
  return (reference) => {
    if (cellCount(reference) > items.length) {
      return items.filter(({ fills }) => cellsShared(fills, reference) > 0);
    }
    const met = new Set(cellKeys(reference).flatMap((cell) => byCell.get(cell) ?? []));
    return [...met].sort((a, b) => (order.get(a) ?? 0) - (order.get(b) ?? 0));
  };
}

/** Every cell of a rectangle, row by row. */
export function cellsOf(area: Reference): Reference[] {
  const { sheet, firstRow, firstColumn } = area;
  const width = columnCount(area);
  return Array.from({ length: cellCount(area) }, (_, index) => {
    const row = firstRow + Math.floor(index / width);
    const column = firstColumn + (index % width);
    return { sheet, firstRow: row, lastRow: row, firstColumn: column, lastColumn: column };
  });
}

function cellKeys(area: Reference): string[] {
  return cellsOf(area).map(
    ({ sheet, firstRow, firstColumn }) => `${cellName(firstRow, firstColumn)} ${sheet}`,
  );
}
