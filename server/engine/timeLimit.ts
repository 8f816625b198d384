/**
 * Runs work on this thread under a time limit that also ends loops inside the engine.
 *
 * The virtual machine interrupts the running script; no catch block of the work can swallow it.
 * It is a timer, not a sandbox: what the work had built is to be thrown away afterwards.
 */
import { Script } from 'node:vm';
import { isMainThread } from 'node:worker_threads';
import { serverError } from '../problems.ts';

export const DEFAULT_TIME_LIMIT_SECONDS = 15;

const MILLISECONDS_PER_SECOND = 1000;
/** The work is handed to the script through this global name, for the length of the call. */
const HANDOVER = Symbol.for('evenkeel.timeLimitedWork');
const SCRIPT = new Script("globalThis[Symbol.for('evenkeel.timeLimitedWork')]()");

/**
 * What `work` gives. `what` names it in the message, for example the workbook's file.
 *
 * Errors: `time-limit` when it takes longer than `seconds`.
 */
export function withTimeLimit<Result>(seconds: number, what: string, work: () => Result): Result {
  const holder = globalThis as unknown as Record<symbol, (() => Result) | undefined>;
  const outer = holder[HANDOVER];
  holder[HANDOVER] = work;
  try {
    const timeout = Math.max(1, Math.ceil(seconds * MILLISECONDS_PER_SECOND));
    // Without this an interruption would wait for the end of the work; only the main thread hears of one.
    return SCRIPT.runInThisContext({ timeout, breakOnSigint: isMainThread }) as Result;
  } catch (thrown) {
    if ((thrown as { code?: string }).code !== 'ERR_SCRIPT_EXECUTION_TIMEOUT') throw thrown;
    throw serverError('time-limit', { what, seconds });
  } finally {
    holder[HANDOVER] = outer;
  }
}
