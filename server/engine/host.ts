/**
 * A workbook standing in an engine: built once, evaluated, and run again for other inputs.
 */
import type {
  CheckResult,
  Evaluation,
  FormulaCell,
  InputValue,
  OutputValue,
  Problem,
  Value,
} from '../evaluation.ts';
import { isError } from '../evaluation.ts';
import { isFormula, type Scalar, type Workbook } from '../workbook/model.ts';
import { asText, type BuiltEngine, buildEngine } from './build.ts';
import { Cells } from './cells.ts';
import { checkResult, statusesOf } from './checks.ts';
import type { OwnFunctions } from './ownFunctions.ts';
import { Session } from './session.ts';
import { answerArea } from './syntax.ts';
import { versions } from './versions.ts';

export interface HostOptions {
  /** The analyst's own functions, where there are any. */
  readonly ownFunctions?: OwnFunctions | null;
  /** What NOW and TODAY stand for, in ISO 8601. */
  readonly instant: string;
}

/** Values for inputs, by name; null empties the cell. They are values, never formulas. */
export type Given = Readonly<Record<string, Scalar | null>>;

export type Outputs = Record<string, OutputValue>;

export class Host {
  readonly #workbook: Workbook;
  readonly #ownFunctions: OwnFunctions | null;
  readonly #built: BuiltEngine;
  readonly #cells: Cells;
  readonly #session: Session;
  /** The values that the workbook itself has in its inputs. */
  readonly #own: Given;
  /** What was last put into them. */
  #given: Given = {};

  /** Builds the engine; a formula that it cannot take becomes an error in its cell alone. */
  constructor(workbook: Workbook, { ownFunctions = null, instant }: HostOptions) {
    this.#workbook = workbook;
    this.#ownFunctions = ownFunctions;
    this.#session = new Session(instant);
    this.#built = buildEngine(workbook, ownFunctions?.functions ?? [], this.#session);
    this.#cells = new Cells(this.#built.engine, this.#session, this.#built.refused);
    this.#own = Object.fromEntries(
      workbook.inputs.map(({ name, cell }) => [
        name,
        this.#cells.value(this.#cells.place(cell)) as Scalar | null,
      ]),
    );
  }

  /** Puts values into inputs and works the workbook again. The names must be inputs. */
  set(given: Given): void {
    const { engine } = this.#built;
    this.#given = { ...this.#given, ...given };
    engine.suspendEvaluation();
    try {
      for (const { name, cell } of this.#workbook.inputs) {
        if (!Object.hasOwn(given, name)) continue;
        const value = given[name] ?? null;
        engine.setCellContents(this.#cells.place(cell), typeof value === 'string' ? asText(value) : value);
      }
    } finally {
      engine.resumeEvaluation();
    }
  }

  /** The outputs as they stand for these inputs; the inputs then keep the values given. */
  run(given: Given): Outputs {
    this.set(given);
    return this.outputs();
  }

  /** The value of a cell, or the rows of a range, by an address such as `Kettle!B4`. */
  values(address: string): Value | Value[][] {
    return this.#cells.values(address);
  }

  outputs(): Outputs {
    return Object.fromEntries(
      this.#workbook.outputs.map(({ name, cell, unit, digits }) => [
        name,
        { cell, value: this.#cells.values(cell), unit, digits },
      ]),
    );
  }

  /** Everything that there is to know of the workbook as it stands, its checks worked as well. */
  evaluate(): Evaluation {
    const { title, about, file, sha256 } = this.#workbook;
    const sheets = this.#sheets();
    return {
      evaluation: 1,
      workbook: { title, about, file, sha256 },
      versions: versions(this.#ownFunctions),
      inputs: this.#inputs(),
      outputs: this.outputs(),
      sheets,
      formulas: this.#formulas(),
      problems: this.#problems(sheets),
      // Checks change the inputs: no cell may be read after them.
      checks: this.#checks(),
      instant: this.#session.instantRead,
    };
  }

  #inputs(): Record<string, InputValue> {
    return Object.fromEntries(
      this.#workbook.inputs.map(({ name, ...input }) => [
        name,
        { ...input, value: this.#cells.value(this.#cells.place(input.cell)), own: this.#own[name] ?? null },
      ]),
    );
  }

  #sheets(): Record<string, Value[][]> {
    return Object.fromEntries(this.#workbook.sheets.map(({ name }) => [name, this.#cells.sheet(name)]));
  }

  #formulas(): Record<string, FormulaCell> {
    const formulas: Record<string, FormulaCell> = {};
    for (const { name, rows } of this.#workbook.sheets) {
      const sheet = this.#built.engine.getSheetId(name)!;
      rows.forEach((cells, row) =>
        cells.forEach((content, col) => {
          if (!isFormula(content)) return;
          const place = { sheet, row, col };
          formulas[this.#cells.addressOf(place)] = {
            formula: content.formula,
            lastCell: this.#lastCell(place),
            comesFrom: this.#cells.comesFrom(place),
            answers: this.#session.answersAt(place),
          };
        }),
      );
    }
    return formulas;
  }

  #lastCell(place: { sheet: number; row: number; col: number }): string | null {
    const area = answerArea(this.#built.engine, place);
    if (area.lastRow === place.row && area.lastColumn === place.col) return null;
    return this.#cells.addressOf({ sheet: place.sheet, row: area.lastRow, col: area.lastColumn });
  }

  /** The cells where an error begins; those that only pass it on are left out. */
  #problems(sheets: Readonly<Record<string, Value[][]>>): Problem[] {
    const problems: Problem[] = [];
    for (const [name, rows] of Object.entries(sheets)) {
      const sheet = this.#built.engine.getSheetId(name)!;
      rows.forEach((cells, row) =>
        cells.forEach((value, col) => {
          if (!isError(value)) return;
          const cell = this.#cells.addressOf({ sheet, row, col });
          if (this.#cells.addressOf(this.#cells.origin({ sheet, row, col })) !== cell) return;
          problems.push({ cell, code: value.error, message: value.message });
        }),
      );
    }
    return problems;
  }

  /** Works each check on the workbook's own inputs with the check's changes, and puts back what was given. */
  #checks(): CheckResult[] {
    const given = { ...this.#own, ...this.#given };
    const results = this.#workbook.checks.map((check) => {
      const found = this.run({ ...this.#own, ...check.given });
      return checkResult(check, found, (address) =>
        statusesOf(this.#session.answersAt(this.#cells.place(address))),
      );
    });
    if (results.length > 0) this.set(given);
    return results;
  }
}
