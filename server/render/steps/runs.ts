/**
 * Formulas that repeat one another down a column or along a row, gathered into runs.
 *
 * A table with a case on each row is one run for each of its columns, however long it is.
 */
import { cellsFilled, type Evaluation } from '../../evaluation.ts';
import { columnCount, rowCount, spanned, type Reference } from '../../workbook/address.ts';
import type { PlacedFormula } from './placedFormula.ts';
import { relativeFormula } from './relativeFormula.ts';

/** One formula, or several that are the same when read from their own cell. */
export interface Run {
  readonly formulas: readonly [PlacedFormula, ...PlacedFormula[]];
  /** All cells that the run fills: a full rectangle. */
  readonly fills: Reference;
}

/** In the order of the sheets, then of the rows, then of the columns. */
export function formulaRuns(evaluation: Evaluation): Run[] {
  const placed = placedFormulas(evaluation);
  const waiting = new Map(placed.map((formula) => [key(formula.fills), formula]));
  const runs: Run[] = [];
  for (const first of placed) {
    if (!waiting.has(key(first.fills))) continue;
    const down = followers(first, waiting, rowCount(first.fills), 0);
    const across = followers(first, waiting, 0, columnCount(first.fills));
    const rest = across.length > down.length ? across : down;
    for (const { fills } of [first, ...rest]) waiting.delete(key(fills));
    runs.push({ formulas: [first, ...rest], fills: spanned(first.fills, (rest.at(-1) ?? first).fills) });
  }
  return runs;
}

function placedFormulas(evaluation: Evaluation): PlacedFormula[] {
  const sheetOrder = new Map(Object.keys(evaluation.sheets).map((sheet, index) => [sheet, index]));
  const order = ({ sheet }: Reference) => sheetOrder.get(sheet) ?? sheetOrder.size;
  return Object.entries(evaluation.formulas)
    .map(([address, formula]) => ({ address, formula, fills: cellsFilled(address, formula) }))
    .sort(
      ({ fills: a }, { fills: b }) =>
        order(a) - order(b) || a.firstRow - b.firstRow || a.firstColumn - b.firstColumn,
    );
}

/** The formulas that continue `first` in steps of so many rows and columns. */
function followers(
  first: PlacedFormula,
  waiting: ReadonlyMap<string, PlacedFormula>,
  rows: number,
  columns: number,
): PlacedFormula[] {
  const pattern = relativeFormula(first);
  const found: PlacedFormula[] = [];
  for (let step = 1; ; step += 1) {
    const next = waiting.get(key(shifted(first.fills, step * rows, step * columns)));
    if (next === undefined || relativeFormula(next) !== pattern) return found;
    found.push(next);
  }
}

function shifted(area: Reference, rows: number, columns: number): Reference {
  return {
    sheet: area.sheet,
    firstRow: area.firstRow + rows,
    lastRow: area.lastRow + rows,
    firstColumn: area.firstColumn + columns,
    lastColumn: area.lastColumn + columns,
  };
}

/** Formulas are followed only by formulas whose answers have the same size, so the whole area is the key. */
function key({ sheet, firstRow, firstColumn, lastRow, lastColumn }: Reference): string {
  return `${firstRow} ${firstColumn} ${lastRow} ${lastColumn} ${sheet}`;
}
