import { inputError } from '../../errors.ts';
import type { Parameter } from '../entry.ts';
import { describe } from './describe.ts';

/** A number from one cell. A text that looks like a number, a truth value and a blank are errors. */
export function number(summary: string): Parameter<number> {
  return {
    summary,
    isOptional: false,
    read(given, argument) {
      if (typeof given === 'number' && Number.isFinite(given)) return given;
      throw inputError('argument-kind', { argument, given: describe(given), wanted: 'a number' });
    },
  };
}

/** A number greater than zero from one cell. */
export function positiveNumber(summary: string): Parameter<number> {
  return {
    summary,
    isOptional: false,
    read(given, argument) {
      if (typeof given === 'number' && given > 0 && Number.isFinite(given)) return given;
      throw inputError('argument-kind', {
        argument,
        given: describe(given),
        wanted: 'a number greater than 0',
      });
    },
  };
}
