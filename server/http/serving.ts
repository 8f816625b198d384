/** What the server shows, and how it evaluates. */
import type { Given } from '../engine/host.ts';
import type { Evaluation } from '../evaluation.ts';
import { suggestion } from '../nearest.ts';
import type { OwnFunctions } from '../engine/ownFunctions.ts';
import { serverError } from '../problems.ts';
import type { Workbook } from '../workbook/model.ts';

export interface Serving {
  /** By name, all read before the first request: nothing in a request leads to a file. */
  readonly workbooks: ReadonlyMap<string, Workbook>;
  readonly ownFunctions: OwnFunctions | null;
  /** Evaluates one of the workbooks; the name is one of theirs. */
  readonly evaluate: (name: string, given: Given) => Promise<Evaluation>;
}

/** Each workbook by the name of its file without the ending. Errors: `served-twice`. */
export function byName(workbooks: readonly Workbook[]): Map<string, Workbook> {
  const named = new Map<string, Workbook>();
  for (const workbook of workbooks) {
    const name = workbook.file.replace(/\.[^.]*$/, '');
    const first = named.get(name);
    if (first !== undefined) {
      throw serverError('served-twice', { first: first.file, second: workbook.file, name });
    }
    named.set(name, workbook);
  }
  return named;
}

/** Errors: `workbook-unknown`, and those of the evaluation. */
export function evaluateServed(serving: Serving, name: string, given: Given): Promise<Evaluation> {
  const { workbooks, evaluate } = serving;
  if (workbooks.has(name)) return evaluate(name, given);
  throw serverError('workbook-unknown', { name, nearest: suggestion(name, [...workbooks.keys()]) });
}
