/**
 * What a formula cell answers, as a test wants to have it.
 */
import { expect } from 'vitest';
import type { CellTable } from '../../../functions/cells/entry.ts';
import { isError, type Value } from '../../../server/evaluation.ts';
import { formulaValue } from '../formulaValue.ts';

type Cells = Readonly<Record<string, CellTable>>;

/** Rows of the answer; one row of one cell for a single value. */
export function rowsOf(formula: string, cells: Cells = {}): Value[][] {
  const found = formulaValue(formula, cells);
  return Array.isArray(found) ? found : [[found]];
}

/** The one number that the formula gives. */
export function numberOf(formula: string, cells: Cells = {}): number {
  const [[value]] = rowsOf(formula, cells) as [[Value]];
  expect(value).toBeTypeOf('number');
  return value as number;
}

/** The message of the error with this code that the formula gives. */
export function messageFrom(code: string, formula: string, cells: Cells = {}): string {
  const [[value]] = rowsOf(formula, cells) as [[Value]];
  expect(value).toMatchObject({ error: code });
  return isError(value) ? value.message : '';
}
