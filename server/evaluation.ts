/**
 * The waist of Evenkeel: everything before it makes an evaluation, everything after it reads one.
 *
 * An evaluation is plain, frozen data that survives JSON without loss. Reports, audits and records
 * are functions of it alone and need no engine.
 */
import type { Outcome } from '../functions/equilibrium/outcome.ts';
import { readReference, type Reference, spanned } from './workbook/address.ts';

export interface Evaluation {
  /** Version of this format. */
  readonly evaluation: 1;
  readonly workbook: WorkbookIdentity;
  /** What computed it; equal versions and equal inputs give equal bits. */
  readonly versions: Versions;
  /** What NOW and TODAY stood for (ISO 8601, UTC); null where no formula asked. */
  readonly instant: string | null;
  /** By name, in the order of the workbook. */
  readonly inputs: Readonly<Record<string, InputValue>>;
  readonly outputs: Readonly<Record<string, OutputValue>>;
  /** Every sheet row by row from A1. */
  readonly sheets: Readonly<Record<string, readonly (readonly Value[])[]>>;
  /** The cells with a formula, by address such as `Kettle!E3`. */
  readonly formulas: Readonly<Record<string, FormulaCell>>;
  /** Every cell whose error begins there, in the order of the sheets. */
  readonly problems: readonly Problem[];
  readonly checks: readonly CheckResult[];
}

export interface WorkbookIdentity {
  readonly title: string;
  readonly about: string;
  /** Name of the file, without its folder. */
  readonly file: string;
  /** Digest of the file's bytes. */
  readonly sha256: string;
}

export interface Versions {
  readonly evenkeel: string;
  readonly hyperformula: string;
  readonly node: string;
  /** The file of the analyst's own functions, where one was given. */
  readonly ownFunctions: { readonly file: string; readonly sha256: string } | null;
}

/** What a cell holds: a number, a text, a truth value, a blank (null) or an error. */
export type Value = number | string | boolean | null | ErrorValue;

export interface ErrorValue {
  /** A code of the error tables. */
  readonly error: string;
  readonly message: string;
}

export interface InputValue {
  /** Canonical address, `Kettle!B4`. */
  readonly cell: string;
  readonly value: Value;
  /** What the workbook itself has there; another one than `value` where it was worked with other values. */
  readonly own: Value;
  readonly unit: string | null;
  readonly min: number | null;
  readonly max: number | null;
  /** Standard uncertainty, in the unit of the input. */
  readonly uncertainty: number | null;
}

export interface OutputValue {
  /** Canonical address of a cell or a range. */
  readonly cell: string;
  readonly value: Value | readonly (readonly Value[])[];
  /** A label of the author's. */
  readonly unit: string | null;
  /** Significant digits to show; the value itself is never rounded. */
  readonly digits: number | null;
}

export interface FormulaCell {
  /** The author's own text. */
  readonly formula: string;
  /** Last cell of an array answer, `Kettle!D7`; null for an answer of one cell. */
  readonly lastCell: string | null;
  /** The cells and ranges that the formula reads, as addresses. */
  readonly comesFrom: readonly string[];
  /** What our cell functions in it answered, in the order in which they were worked. */
  readonly answers: readonly FunctionAnswer[];
}

export interface FunctionAnswer {
  readonly function: string;
  readonly unit: string | null;
  /** The evidence, where an equilibrium was solved. */
  readonly outcome: Outcome | null;
}

export interface Problem {
  readonly cell: string;
  readonly code: string;
  readonly message: string;
}

export interface CheckResult {
  readonly passed: boolean;
  /** The inputs that the case changed. */
  readonly given: Readonly<Record<string, number | string | boolean>>;
  readonly expected: Readonly<Record<string, unknown>>;
  readonly found: Readonly<Record<string, OutputValue['value']>>;
  /** How far a number may lie from the expected one, by output; null where no number is expected. */
  readonly within: Readonly<
    Record<string, { readonly absolute: number } | { readonly relative: number } | null>
  >;
  /** Where the expected values come from. */
  readonly source: string;
}

/** Whether the value is an error. */
export function isError(value: Value): value is ErrorValue {
  return typeof value === 'object' && value !== null;
}

/** The cells that the answer of the formula at this address fills. */
export function cellsFilled(address: string, { lastCell }: FormulaCell): Reference {
  const first = readReference(address);
  const last = lastCell === null ? first : readReference(lastCell);
  if (first === null || last === null) throw new Error(`invariant: ${address} is the address of a cell`);
  return spanned(first, last);
}
