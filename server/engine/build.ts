/**
 * Builds the engine from a workbook.
 *
 * Every setting and every mending here answers a finding about the engine (HyperFormula 3.5.0) that
 * has its test, so that an upgrade reports itself.
 */
import * as hyperformula from 'hyperformula';
import type { CellFunction } from '../../functions/cells/entry.ts';
import { type InputError, isInputError } from '../../functions/errors.ts';
import { registerEvenkeel } from '../../functions/plugin.ts';
import { cellName } from '../workbook/address.ts';
import { type CellContent, isFormula, type Workbook } from '../workbook/model.ts';
import { nameTable, prepareFormula } from '../workbook/prepareFormula.ts';
import type { Session } from './session.ts';
import { registerReplacements } from './replacements.ts';

type RawCell = string | number | boolean | null;

export interface BuiltEngine {
  readonly engine: hyperformula.HyperFormula;
  /** Formulas that were kept from the engine, by `Sheet!cell` as the engine writes it, and why. */
  readonly refused: ReadonlyMap<string, InputError>;
}

/** What stands in the engine for a formula that it cannot take: an error, so that dependents show one too. */
const REFUSED_FORMULA = '=NA()';
/** The engine's default limit of rows; a sheet with more needs its own. */
const USUAL_MAX_ROWS = 40_000;

export function buildEngine(
  workbook: Workbook,
  ownFunctions: readonly CellFunction[],
  session: Session,
): BuiltEngine {
  registerEvenkeel(hyperformula, ownFunctions);
  registerReplacements();
  const names = nameTable(workbook.names);
  const refused = new Map<string, InputError>();
  const raw = (content: CellContent, sheet: string, row: number, column: number): RawCell => {
    if (content === null || typeof content !== 'object') return content;
    if (!isFormula(content)) return asText(content.text);
    try {
      return prepareFormula(content.formula, names);
    } catch (thrown) {
      if (!isInputError(thrown)) throw thrown;
      refused.set(`${sheet}!${cellName(row, column)}`, thrown);
      return REFUSED_FORMULA;
    }
  };
  const sheets = workbook.sheets.map(({ name, rows }) => [
    name,
    rows.map((cells, row) => cells.map((content, column) => raw(content, name, row, column))),
  ]);
  const engine = hyperformula.HyperFormula.buildFromSheets(Object.fromEntries(sheets), {
    licenseKey: 'gpl-v3',
    context: session,
    useArrayArithmetic: workbook.arrayArithmetic,
    // With the defaults =1/3 becomes 0.33333333333, and values near 1e-15 are damaged.
    smartRounding: false,
    precisionEpsilon: 0,
    // A wildcard criterion over a wide range can run for minutes.
    useWildcards: false,
    maxRows: Math.max(USUAL_MAX_ROWS, ...workbook.sheets.map(({ rows }) => rows.length)),
  });
  return { engine, refused };
}

/** A text as the engine takes it unread; without the apostrophe it would make 50% and 1/2/2024 numbers. */
export function asText(text: string): string {
  return `'${text}`;
}
