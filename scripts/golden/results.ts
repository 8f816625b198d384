/** The results of a sample workbook as a flat list, one value a line, so that a diff shows what moved. */
import { cellName } from '../../server/workbook/address.ts';

export type Result = number | string | boolean | { readonly error: string };

/** By what the value is: `output extent`, `output profile [2][0]`, `cell Kettle!E3`, `check 1 extent`. */
export type Results = Readonly<Record<string, Result>>;

/** The part of `evenkeel evaluate --cells --json` that is kept. */
export interface EvaluationJson {
  readonly outputs: Readonly<Record<string, { readonly value: unknown }>>;
  readonly sheets: Readonly<Record<string, readonly (readonly unknown[])[]>>;
  readonly checks: readonly { readonly found: Readonly<Record<string, unknown>> }[];
}

export function resultsOf({ outputs, sheets, checks }: EvaluationJson): Results {
  return Object.fromEntries([
    ...Object.entries(outputs).flatMap(([name, { value }]) => leaves(`output ${name}`, value)),
    ...checks.flatMap(({ found }, index) =>
      Object.entries(found).flatMap(([name, value]) => leaves(`check ${index + 1} ${name}`, value)),
    ),
    ...Object.entries(sheets).flatMap(([sheet, rows]) =>
      rows.flatMap((cells, row) =>
        cells.flatMap((value, column) => leaves(`cell ${sheet}!${cellName(row, column)}`, value)),
      ),
    ),
  ]);
}

function leaves(name: string, value: unknown): [string, Result][] {
  if (value === null || value === undefined) return [];
  if (Array.isArray(value)) return value.flatMap((part, index) => leaves(`${name}[${index}]`, part));
  if (typeof value === 'object') return [[name, { error: (value as { error: string }).error }]];
  return [[name, value as Result]];
}

/**
 * What moved from one list to the other, one line for each. What is new or gone has not moved, and
 * neither has a label: a text in a cell that becomes another text.
 */
export function moved(before: Results, after: Results): string[] {
  return Object.entries(before)
    .filter(([name, was]) => {
      const now = after[name];
      if (now === undefined || JSON.stringify(was) === JSON.stringify(now)) return false;
      return !(name.startsWith('cell ') && typeof was === 'string' && typeof now === 'string');
    })
    .map(([name, was]) => `${name}: was ${JSON.stringify(was)}, now ${JSON.stringify(after[name])}`);
}
