import { inputError } from '../../errors.ts';
import type { Parameter } from '../entry.ts';
import { describe } from './describe.ts';

/** A text from one cell, without the white space around it. */
export function text(summary: string): Parameter<string> {
  return {
    summary,
    isOptional: false,
    read(given, argument) {
      const words = typeof given === 'string' ? given.trim() : '';
      if (words !== '') return words;
      throw inputError('argument-kind', { argument, given: describe(given), wanted: 'a text' });
    },
  };
}
