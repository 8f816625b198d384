/**
 * A workbook: plain data that survives JSON without loss, whatever file it was read from.
 *
 * What a reader hands over holds together: sheets exist that are pointed at, inputs are cells with
 * a value, names are usable, every address is canonical (`Kettle!B4`, `Kettle!D3:D7`).
 */
import type { Status } from '../../functions/equilibrium/outcome.ts';

export interface Workbook {
  readonly title: string;
  readonly about: string;
  /** As the person named it; `-` for standard input. */
  readonly file: string;
  /** Digest of the file's bytes, in hexadecimal. */
  readonly sha256: string;
  /** Range names and where they point: `Kettle!$A$3:$C$7`. Look names up through `nameTable`. */
  readonly names: Readonly<Record<string, string>>;
  readonly sheets: readonly Sheet[];
  readonly inputs: readonly Input[];
  readonly outputs: readonly Output[];
  readonly checks: readonly Check[];
  /** Whether operators work cell by cell on ranges without being told to. */
  readonly arrayArithmetic: boolean;
}

export interface Sheet {
  readonly name: string;
  /** Row by row from A1, all of one length. */
  readonly rows: readonly (readonly CellContent[])[];
}

/** A blank (null), a number, a truth value, a text, or a formula as its author wrote it, with its `=`. */
export type CellContent = null | number | boolean | TextCell | FormulaCell;

export interface TextCell {
  readonly text: string;
}

export interface FormulaCell {
  readonly formula: string;
}

/** A cell that a case, such as that of a check or of `--set`, may change. */
export interface Input {
  readonly name: string;
  /** `Kettle!B4` */
  readonly cell: string;
  readonly unit: string | null;
  readonly min: number | null;
  readonly max: number | null;
  /** Standard uncertainty, in the unit of the input. */
  readonly uncertainty: number | null;
}

/** A cell or a range that is reported. */
export interface Output {
  readonly name: string;
  /** `Kettle!E3` or `Kettle!D4:D7` */
  readonly cell: string;
  /** A label only: nothing is converted. */
  readonly unit: string | null;
  /** Significant digits to show, 1 to 17. */
  readonly digits: number | null;
}

/** One of the workbook's own acceptance cases. */
export interface Check {
  /** Values of inputs, by name; the others keep theirs. */
  readonly given: Readonly<Record<string, Scalar>>;
  readonly expect: readonly Expectation[];
  /** Where the expected values come from. */
  readonly source: string;
}

export type Scalar = number | string | boolean;

export interface Expectation {
  /** Name of the output. */
  readonly output: string;
  /** A value for a cell; rows of values for a range. */
  readonly expected: Expected | readonly (readonly Expected[])[];
  /** Given wherever a number is expected, null elsewhere. */
  readonly within: Tolerance | null;
}

/**
 * What a cell should show: a number within the tolerance, a text or truth value exactly, a blank
 * (null), an error with this code, or any answer whose equilibrium ended with this status.
 */
export type Expected = Scalar | null | { readonly error: string } | { readonly status: Status };

/** Whether these are rows of values, and not one. */
export function isRows<Cell>(
  value: Cell | readonly (readonly Cell[])[],
): value is readonly (readonly Cell[])[] {
  return Array.isArray(value);
}

/** How far a number may lie from the expected one. */
export type Tolerance = { readonly absolute: number } | { readonly relative: number };

/** Whether the cell holds a formula. */
export function isFormula(content: CellContent): content is FormulaCell {
  return typeof content === 'object' && content !== null && 'formula' in content;
}
