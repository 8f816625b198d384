/**
 * One evaluation of a workbook under a time limit.
 */
import type { Evaluation } from '../evaluation.ts';
import type { Workbook } from '../workbook/model.ts';
import { type Given, Host } from './host.ts';
import { checkGiven } from './given.ts';
import type { OwnFunctions } from './ownFunctions.ts';
import { DEFAULT_TIME_LIMIT_SECONDS, withTimeLimit } from './timeLimit.ts';

export interface EvaluateOptions {
  /** Values for inputs, in the place of the workbook's own. */
  readonly given?: Given;
  readonly ownFunctions?: OwnFunctions | null;
  readonly timeLimitSeconds?: number;
  /** What NOW and TODAY stand for; the present where left out. */
  readonly instant?: string;
}

/**
 * The evaluation of a workbook, frozen.
 *
 * Errors: `given-unknown`, `given-kind`, `given-limits` for the given values, and `time-limit`.
 * Whatever is wrong in a cell is in the evaluation.
 */
export function evaluateWorkbook(workbook: Workbook, options: EvaluateOptions = {}): Evaluation {
  const { given = {}, ownFunctions = null, timeLimitSeconds = DEFAULT_TIME_LIMIT_SECONDS } = options;
  const instant = options.instant ?? new Date().toISOString();
  checkGiven(workbook, given);
  return withTimeLimit(timeLimitSeconds, workbook.file, () => {
    const host = new Host(workbook, { ownFunctions, instant });
    host.set(given);
    return deepFrozen(host.evaluate());
  });
}

function deepFrozen<Data>(data: Data): Data {
  if (typeof data !== 'object' || data === null || Object.isFrozen(data)) return data;
  Object.values(data).forEach(deepFrozen);
  return Object.freeze(data);
}
