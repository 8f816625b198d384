import { expect } from 'vitest';
import { isInputError } from '../../functions/errors.ts';

/** The message of the input error that the call raises; fails unless it has this code. */
export function messageOf(code: string, call: () => unknown): string {
  try {
    call();
  } catch (thrown) {
    if (!isInputError(thrown)) throw thrown;
    expect(thrown.code).toBe(code);
    return thrown.message;
  }
  throw new Error(`no error was raised; ${code} was expected`);
}
