import { inputError } from '../../errors.ts';
import type { CellValue, Parameter } from '../entry.ts';
import { describe } from './describe.ts';

/** A number from one cell. A text that looks like a number, a truth value and a blank are errors. */
export function number(summary: string): Parameter<number> {
  return {
    summary,
    isOptional: false,
    read(given, argument) {
      if (typeof given === 'number' && Number.isFinite(given)) return given;
      throw notANumber(given, argument, 'a number');
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
      throw notANumber(given, argument, 'a number greater than 0');
    },
  };
}

const DECIMAL_COMMA = /^\s*-?\d+,\d+(?:[eE]-?\d+)?\s*$/;

function notANumber(given: CellValue, argument: string, wanted: string) {
  const hasComma = typeof given === 'string' && DECIMAL_COMMA.test(given);
  return inputError('argument-kind', {
    argument,
    given: describe(given),
    wanted: hasComma ? `${wanted} with a decimal point` : wanted,
  });
}
