/** Errors that the formula engine finds while it works a cell. */
import type { ErrorTemplate } from '../../functions/errorTable.ts';

export const ENGINE_ERRORS = {
  'division-by-zero': {
    says: 'the formula divides by zero',
    remedy: 'Check the cell that it divides by; a blank cell counts as 0.',
  },
  'unknown-function': {
    says: 'there is no function {name}',
    remedy: '{nearest} `evenkeel functions` lists ours.',
  },
  'wrong-kind': {
    says: 'a value is of the wrong kind for the formula ({detail})',
    remedy: 'Check that numbers are numbers and not texts, and that a range stands only where one is wanted.',
  },
  'number-range': {
    says: 'a number is out of range ({detail})',
    remedy: 'Check the arguments of the formula.',
  },
  'not-available': {
    says: 'a value is not available ({detail})',
    remedy: 'Check what the formula looks up, and the number of its arguments.',
  },
  cycle: {
    says: 'the formula depends on its own cell',
    remedy: 'Break the circle; an equilibrium needs no iteration on the sheet.',
  },
  'reference-lost': {
    says: 'the formula reads a cell or sheet that does not exist ({detail})',
    remedy: 'Correct the reference.',
  },
  'array-blocked': {
    says: 'the array answer has no room',
    remedy: 'Clear the cells below and to the right of the formula.',
  },
  'formula-unparsed': {
    says: 'the formula cannot be read ({detail})',
    remedy: 'Check brackets, quotes and commas.',
  },
  'random-value': {
    says: '{name} gives another value each time, so that nothing that reads it could be retraced',
    remedy: 'Type the value into a cell, or make it an input and give it another value for each case.',
  },
} as const satisfies Record<string, ErrorTemplate>;
