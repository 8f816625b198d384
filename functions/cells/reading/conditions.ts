/**
 * Reads a conditions table: rows `quantity | value | unit | standard uncertainty`, in any order.
 *
 * Everything that a row can get wrong is an error here, so that nobody after this needs to check it
 * again. Whether a row is needed is for the calculation to say.
 */
import { convertDifference, convertValue } from '../../chemistry/units/convert.ts';
import { nearestSpelling } from '../../chemistry/units/nearestSpelling.ts';
import type { Unit } from '../../chemistry/units/unit.ts';
import { inputError } from '../../errors.ts';
import type { CellScalar, CellTable, Parameter } from '../entry.ts';
import { describe } from '../parameters/describe.ts';
import { readConditionUnit, readUncertainty, readValue, refuseImpossible } from './conditionCells.ts';
import {
  CONDITION_NAMES,
  CONDITION_RULES,
  type ConditionName,
  type ConditionRule,
  conditionName,
} from './conditionRows.ts';
import { coverageFactorUnder } from './heading.ts';
import { isHeadingWord } from './lines.ts';
import { isBlank } from './tableForm.ts';

export interface Condition {
  /** Place in the table, counted from 1. */
  readonly row: number;
  readonly value: number | string;
  readonly unit: Unit | null;
  /** Standard uncertainty in the row's own unit, as a difference. */
  readonly uncertainty: number | null;
}

export interface Conditions {
  readonly rows: ReadonlyMap<ConditionName, Condition>;
  /** Species held out of reaction, as written. */
  readonly inert: readonly string[];
}

export const NO_CONDITIONS: Conditions = { rows: new Map(), inert: [] };

/** A conditions table as an argument. */
export function conditions(summary: string): Parameter<Conditions> {
  return { summary, isOptional: false, read: readConditions };
}

/**
 * The conditions that a table states.
 *
 * Errors: `condition-table`, `condition-unknown`, `condition-twice`, `condition-value`,
 * `condition-unit`, `condition-uncertainty`; each names the row.
 */
function readConditions(given: unknown, argument: string): Conditions {
  if (!Array.isArray(given)) throw wrongTable(argument, given as CellScalar);
  const table = given as CellTable;
  if (table[0]!.length < 2 || table[0]!.length > 4) throw wrongTable(argument, table);
  const rows = new Map<ConditionName, Condition>();
  const uncertainties: { of: ConditionName; row: number; line: readonly CellScalar[] }[] = [];
  const inert: string[] = [];
  const hasHeading = isHeadingWord(table[0]![0]!, 'quantity');
  const coverageFactor = hasHeading ? coverageFactorUnder(table[0]!, argument) : 1;
  table.forEach((line, index) => {
    const row = index + 1;
    if (isBlank(line) || (hasHeading && index === 0)) return;
    const title = typeof line[0] === 'string' ? line[0] : '';
    const name = conditionName(title);
    if (name === undefined) {
      const of = conditionName(title.replace(/ uncertainty\s*$/i, ''));
      if (of === undefined) throw unknownCondition(argument, row, line[0]!);
      uncertainties.push({ of, row, line });
      return;
    }
    const condition = readRow(name, line, `${argument} row ${row} (${name})`, row, coverageFactor);
    if (name === 'inert') {
      inert.push(condition.value as string);
      return;
    }
    if (rows.has(name))
      throw inputError('condition-twice', { argument, name, row, first: rows.get(name)!.row });
    rows.set(name, condition);
  });
  for (const { of, row, line } of uncertainties)
    addUncertainty(rows, of, line, `${argument} row ${row}`, row);
  return { rows, inert };
}

function readRow(
  name: ConditionName,
  line: readonly CellScalar[],
  place: string,
  row: number,
  coverageFactor: number,
): Condition {
  const rule: ConditionRule = CONDITION_RULES[name];
  const value = readValue(rule, line[1]!, place);
  const unit = readConditionUnit(rule, line[2] ?? null, place);
  refuseImpossible(rule, value, unit, place);
  if (line[3] === undefined || line[3] === null || line[3] === '')
    return { row, value, unit, uncertainty: null };
  return { row, value, unit, uncertainty: readUncertainty(rule, line[3], place) / coverageFactor };
}

/** A row `temperature uncertainty | 2 | K` beside the row `temperature | 70 | degC`. */
function addUncertainty(
  rows: Map<ConditionName, Condition>,
  of: ConditionName,
  line: readonly CellScalar[],
  place: string,
  row: number,
): void {
  const condition = rows.get(of);
  const rule: ConditionRule = CONDITION_RULES[of];
  if (condition === undefined || condition.unit === null)
    throw inputError('condition-uncertainty-alone', { place, of });
  if (condition.uncertainty !== null) {
    throw inputError('condition-twice', {
      argument: place,
      name: `${of} uncertainty`,
      row,
      first: condition.row,
    });
  }
  const unit = readConditionUnit(rule, line[2] ?? null, place);
  const value = readUncertainty(rule, line[1]!, place);
  rows.set(of, { ...condition, uncertainty: convertDifference(value, unit!, condition.unit) });
}

/** The value of a measured condition in the unit wanted, or undefined where there is no such row. */
export function measured(given: Conditions, name: ConditionName, unit: Unit): number | undefined {
  const condition = given.rows.get(name);
  return condition === undefined ? undefined : convertValue(condition.value as number, condition.unit!, unit);
}

function wrongTable(argument: string, given: CellScalar | CellTable) {
  return inputError('condition-table', { argument, given: describe(given) });
}

function unknownCondition(argument: string, row: number, cell: CellScalar) {
  const nearest = typeof cell === 'string' ? nearestSpelling(cell.trim(), CONDITION_NAMES) : null;
  const suggestion = nearest === null ? '' : `Did you mean ${nearest}? `;
  const names = CONDITION_NAMES.join(', ');
  return inputError('condition-unknown', { argument, row, given: describe(cell), suggestion, names });
}
