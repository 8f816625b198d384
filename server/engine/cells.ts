/**
 * Reads the cells of a built engine: values, errors with their origin, what a formula comes from.
 */
import { type CellValue, DetailedCellError, type HyperFormula } from 'hyperformula';
import type { InputError } from '../../functions/errors.ts';
import type { CellPlace } from '../../functions/plugin.ts';
import type { Value } from '../evaluation.ts';
import { type Area, readReference, referenceName } from '../workbook/address.ts';
import { errorValue } from './cellErrors.ts';
import type { Session } from './session.ts';

export class Cells {
  readonly #engine: HyperFormula;
  readonly #session: Session;
  readonly #refused: ReadonlyMap<string, InputError>;

  constructor(engine: HyperFormula, session: Session, refused: ReadonlyMap<string, InputError>) {
    this.#engine = engine;
    this.#session = session;
    this.#refused = refused;
  }

  /** The place of an address such as `Kettle!B4`; its sheet must exist. */
  place(address: string): CellPlace {
    const { sheet, firstRow: row, firstColumn: col } = readReference(address)!;
    return { sheet: this.#engine.getSheetId(sheet)!, row, col };
  }

  /** `Kettle!B4`, or `Kettle!B4:C7` for more than one cell. */
  address(sheet: number, area: Area): string {
    return referenceName({ sheet: this.#engine.getSheetName(sheet)!, ...area });
  }

  addressOf({ sheet, row, col }: CellPlace): string {
    return this.address(sheet, { firstRow: row, firstColumn: col, lastRow: row, lastColumn: col });
  }

  value(place: CellPlace): Value {
    return this.readValue(this.#engine.getCellValue(place), place);
  }

  /** A value of the engine's at this place, an error with its code and message. */
  readValue(value: CellValue, place: CellPlace): Value {
    if (!(value instanceof DetailedCellError)) return value;
    const origin = this.origin(place);
    const refused = this.#refused.get(this.addressOf(origin));
    if (refused !== undefined) return { error: refused.code, message: refused.message };
    return errorValue(value, origin, this.#session);
  }

  /** Every value of a cell (one value) or a range (rows of values). */
  values(address: string): Value | Value[][] {
    const { firstRow, firstColumn, lastRow, lastColumn } = readReference(address)!;
    const place = this.place(address);
    if (firstRow === lastRow && firstColumn === lastColumn) return this.value(place);
    const rows: Value[][] = [];
    for (let row = firstRow; row <= lastRow; row++) {
      const cells: Value[] = [];
      for (let col = firstColumn; col <= lastColumn; col++) cells.push(this.value({ ...place, row, col }));
      rows.push(cells);
    }
    return rows;
  }

  /** Every value of a sheet, row by row from A1, as far as there are any. */
  sheet(name: string): Value[][] {
    const sheet = this.#engine.getSheetId(name)!;
    const values = this.#engine.getSheetValues(sheet);
    const { width, height } = usedSize(values);
    return Array.from({ length: height }, (_, row) =>
      Array.from({ length: width }, (__, col) =>
        this.readValue(values[row]![col] ?? null, { sheet, row, col }),
      ),
    );
  }

  /** The cell where the error of this cell began; itself where the error is its own. */
  origin(place: CellPlace): CellPlace {
    const error = this.#engine.getCellValue(place);
    if (!(error instanceof DetailedCellError) || error.address === undefined) return place;
    const told = this.place(error.address);
    // Errors of the engine's parser carry no address, so that the first cell to read one is told instead.
    return this.#firstUnplacedError(told) ?? told;
  }

  #firstUnplacedError(place: CellPlace): CellPlace | undefined {
    for (const cell of this.#cellsRead(place)) {
      const error = this.#engine.getCellValue(cell);
      if (error instanceof DetailedCellError && error.address === undefined) return cell;
    }
    return undefined;
  }

  /** The cells and ranges that a formula reads, as addresses, in the order of the engine. */
  comesFrom(place: CellPlace): string[] {
    return this.#areasRead(place).map(({ sheet, ...area }) => this.address(sheet, area));
  }

  *#cellsRead(place: CellPlace): Generator<CellPlace> {
    for (const { sheet, firstRow, lastRow, firstColumn, lastColumn } of this.#areasRead(place)) {
      for (let row = firstRow; row <= lastRow; row++) {
        for (let col = firstColumn; col <= lastColumn; col++) yield { sheet, row, col };
      }
    }
  }

  /** A range over whole columns or rows ends where its sheet does; the engine lets it end at infinity. */
  #areasRead(place: CellPlace): (Area & { readonly sheet: number })[] {
    return this.#engine.getCellPrecedents(place).map((read) => {
      const { start, end } = 'start' in read ? read : { start: read, end: read };
      const { width, height } = this.#engine.getSheetDimensions(start.sheet);
      return {
        sheet: start.sheet,
        firstRow: start.row,
        firstColumn: start.col,
        lastRow: Number.isFinite(end.row) ? end.row : Math.max(start.row, height - 1),
        lastColumn: Number.isFinite(end.col) ? end.col : Math.max(start.col, width - 1),
      };
    });
  }
}

/** The rows and columns up to the last value; a cell that is only referred to makes the engine's sheet larger. */
function usedSize(values: readonly (readonly unknown[])[]): { width: number; height: number } {
  let width = 0;
  let height = 0;
  values.forEach((cells, row) =>
    cells.forEach((value, col) => {
      if (value === null || value === undefined) return;
      width = Math.max(width, col + 1);
      height = row + 1;
    }),
  );
  return { width, height };
}
