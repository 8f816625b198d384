/**
 * Every error of a workbook, of the limits and of a formula's text: its code, what it says, how to
 * mend it, the exit code of a command that ends with it, and the HTTP status.
 *
 * The templates stand in `problemTables/`, one file for each way to answer.
 */
import { type Details, type ErrorTemplate, fillTemplate } from '../functions/errorTable.ts';
import { InputError } from '../functions/errors.ts';
import { COMMAND_ERRORS } from './problemTables/command.ts';
import { ENGINE_ERRORS } from './problemTables/engine.ts';
import { FORMULA_ERRORS } from './problemTables/formulas.ts';
import { SIZE_ERRORS, TIME_ERRORS } from './problemTables/limits.ts';
import { READING_ERRORS } from './problemTables/reading.ts';
import {
  ABSENT_PAGES,
  BUSY_SERVER,
  FOREIGN_REQUESTS,
  LARGE_BODIES,
  OTHER_BODIES,
  OTHER_METHODS,
  UNFIT_BODIES,
  UNREADABLE_REQUESTS,
} from './problemTables/request.ts';
import { WORKBOOK_ERRORS } from './problemTables/workbook.ts';

const TABLE = {
  ...READING_ERRORS,
  ...WORKBOOK_ERRORS,
  ...SIZE_ERRORS,
  ...TIME_ERRORS,
  ...FORMULA_ERRORS,
  ...ENGINE_ERRORS,
  ...COMMAND_ERRORS,
  ...UNREADABLE_REQUESTS,
  ...FOREIGN_REQUESTS,
  ...ABSENT_PAGES,
  ...OTHER_METHODS,
  ...LARGE_BODIES,
  ...OTHER_BODIES,
  ...UNFIT_BODIES,
  ...BUSY_SERVER,
};

export type ServerErrorCode = keyof typeof TABLE;

/** How a command or a request that ends with an error is answered. */
interface Answer {
  /** 1: evaluated, but something failed. 2: what was given cannot be read or used, or exceeds a limit. */
  readonly exit: 1 | 2;
  /** Status of RFC 9110. */
  readonly http: 400 | 403 | 404 | 405 | 413 | 415 | 422 | 503;
}

const ANSWERS: readonly (readonly [Record<string, ErrorTemplate>, Answer])[] = [
  [READING_ERRORS, { exit: 2, http: 400 }],
  [WORKBOOK_ERRORS, { exit: 2, http: 422 }],
  [SIZE_ERRORS, { exit: 2, http: 413 }],
  [COMMAND_ERRORS, { exit: 2, http: 422 }],
  [TIME_ERRORS, { exit: 2, http: 422 }],
  [UNREADABLE_REQUESTS, { exit: 2, http: 400 }],
  [FOREIGN_REQUESTS, { exit: 2, http: 403 }],
  [ABSENT_PAGES, { exit: 2, http: 404 }],
  [OTHER_METHODS, { exit: 2, http: 405 }],
  [LARGE_BODIES, { exit: 2, http: 413 }],
  [OTHER_BODIES, { exit: 2, http: 415 }],
  [UNFIT_BODIES, { exit: 2, http: 422 }],
  [BUSY_SERVER, { exit: 2, http: 503 }],
];

/** Errors in a cell, those of the cell functions among them: the workbook was evaluated. */
const CELL_ANSWER: Answer = { exit: 1, http: 422 };

/**
 * The error with this code, its message filled in.
 *
 * `throw serverError('input-formula', { name: 'acid', cell: 'Kettle!B4' })`
 */
export function serverError<Code extends ServerErrorCode>(
  code: Code,
  details: Details<(typeof TABLE)[Code]>,
): InputError {
  return new InputError(code, fillTemplate<(typeof TABLE)[Code]>(TABLE[code], details));
}

/** Exit code and HTTP status for an error with this code. */
export function answerTo(code: string): Answer {
  return ANSWERS.find(([table]) => Object.hasOwn(table, code))?.[1] ?? CELL_ANSWER;
}

/** Code, template, remedy, exit code and HTTP status of every error, for the reference page. */
export function serverErrorTable(): ({ code: ServerErrorCode } & ErrorTemplate & Answer)[] {
  return Object.entries(TABLE).map(([code, template]) => ({
    code: code as ServerErrorCode,
    ...template,
    ...answerTo(code),
  }));
}
