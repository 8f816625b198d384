/** What `evaluate` and `render` have in common: from the words on the command line to an evaluation. */
import { evaluateWorkbook } from '../engine/evaluateWorkbook.ts';
import type { Given } from '../engine/host.ts';
import { type Evaluation, isError, type OutputValue } from '../evaluation.ts';
import { givenByName } from '../givenText.ts';
import type { OwnFunctions } from '../engine/ownFunctions.ts';
import { loadOwnFunctions } from '../ownFunctions.ts';
import { serverError } from '../problems.ts';
import { isRows } from '../workbook/model.ts';
import { ExitCode } from './exitCode.ts';
import { readWorkbook } from './readWorkbook.ts';
import type { Surroundings } from './surroundings.ts';

export interface EvaluatingOptions {
  /** Each `NAME=VALUE`. */
  readonly set?: readonly string[];
  readonly functions?: string;
  /** In seconds. */
  readonly timeLimit?: number;
}

export interface Evaluated {
  /** What `--set` gave. */
  readonly given: Given;
  readonly evaluation: Evaluation;
  readonly ownFunctions: OwnFunctions | null;
}

export async function evaluated(
  file: string,
  { set = [], functions, timeLimit }: EvaluatingOptions,
  { stdin }: Surroundings,
): Promise<Evaluated> {
  const given = givenByName(set.map(nameAndText));
  const ownFunctions = functions === undefined ? null : await loadOwnFunctions(functions);
  const workbook = await readWorkbook(file, stdin, timeLimit);
  const evaluation = evaluateWorkbook(workbook, {
    given,
    ownFunctions,
    ...(timeLimit !== undefined && { timeLimitSeconds: timeLimit }),
  });
  return { given, evaluation, ownFunctions };
}

function nameAndText(text: string): [name: string, text: string] {
  const sign = text.indexOf('=');
  if (sign < 1) throw serverError('given-form', { text });
  return [text.slice(0, sign).trim(), text.slice(sign + 1)];
}

/** Failed where an output holds an error or a check did not pass; an error in any other cell does not count. */
export function exitCodeOf({ outputs, checks }: Evaluation): number {
  const isGood = !Object.values(outputs).some(holdsError) && checks.every(({ passed }) => passed);
  return isGood ? ExitCode.good : ExitCode.failed;
}

function holdsError({ value }: OutputValue): boolean {
  return isRows(value) ? value.flat().some(isError) : isError(value);
}
