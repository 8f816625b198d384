import { type Details, fillTemplate } from './errorTable.ts';
import { AMOUNT_ERRORS } from './errorTables/amounts.ts';
import { ANSWER_ERRORS } from './errorTables/answers.ts';
import { CALL_ERRORS } from './errorTables/call.ts';
import { CONDITION_ERRORS } from './errorTables/conditions.ts';
import { CONSTANT_ERRORS } from './errorTables/constants.ts';
import { EQUATION_ERRORS } from './errorTables/equations.ts';
import { MEDIUM_ERRORS } from './errorTables/medium.ts';
import { SPECIES_ERRORS } from './errorTables/species.ts';
import { UNIT_ERRORS } from './errorTables/units.ts';

/**
 * Every error that a person's input can cause: its code, what it says, and how to mend it.
 *
 * A message reads `<says>. <remedy>`; words in braces are filled in by `inputError`, and the
 * compiler checks that each is given. The plugin puts the name of the cell function in front.
 * Errors that no input can cause are not here: they are assertions.
 */
const TABLE = {
  ...CALL_ERRORS,
  ...CONDITION_ERRORS,
  ...AMOUNT_ERRORS,
  ...MEDIUM_ERRORS,
  ...CONSTANT_ERRORS,
  ...ANSWER_ERRORS,
  ...SPECIES_ERRORS,
  ...EQUATION_ERRORS,
  ...UNIT_ERRORS,
};

export type ErrorCode = keyof typeof TABLE;

/** An error of the person's input. Thrown by readers and parsers, shown in the cell that asked. */
export class InputError extends Error {
  override readonly name = 'InputError';
  readonly code: string;
  constructor(code: string, message: string) {
    super(message);
    this.code = code;
  }
}

/** Whether this is an error of the input; own functions may bring another copy of the class. */
export function isInputError(thrown: unknown): thrown is InputError {
  return thrown instanceof Error && thrown.name === 'InputError' && 'code' in thrown;
}

/**
 * The error with this code, its message filled in.
 *
 * `throw inputError('argument-kind', { argument: 'K', given: 'the text "high"', wanted: 'a number' })`
 */
export function inputError<Code extends ErrorCode>(
  code: Code,
  details: Details<(typeof TABLE)[Code]>,
): InputError {
  return new InputError(code, fillTemplate(TABLE[code], details));
}

/** What `read` gives; an error of the input that it throws is told with its place in front. */
export function withPlace<Read>(place: () => string, read: () => Read): Read {
  try {
    return read();
  } catch (thrown) {
    throw isInputError(thrown) ? new InputError(thrown.code, `${place()}: ${thrown.message}`) : thrown;
  }
}

/** Code, template and remedy of every error, for the reference page. */
export function errorTable(): { code: ErrorCode; says: string; remedy: string }[] {
  return Object.entries(TABLE).map(([code, { says, remedy }]) => ({ code: code as ErrorCode, says, remedy }));
}
