/** Errors of what is handed to a cell function, whatever it is. */
import type { ErrorTemplate } from '../errorTable.ts';

export const CALL_ERRORS = {
  'argument-count': {
    says: '{given} arguments were given; it takes {takes}',
    remedy: 'Its arguments are {usage}.',
  },
  'argument-kind': {
    says: '{argument} is {given}, but {wanted} is wanted',
    remedy: 'Give {wanted}.',
  },
  'function-failed': {
    says: 'it could not be worked ({reason})',
    remedy: 'This is a fault of the function, not of the input: report it with the workbook.',
  },
  'function-name-taken': {
    says: 'the function name {name} is taken',
    remedy: 'Give the function another name, family first, such as PLANT.{name}.',
  },
  'table-lies-otherwise': {
    says: 'the answer has {found} cells where {expected} were expected from the size of the table',
    remedy:
      'A small table that lies across is read as one that lies down; give it as rows, or build it by AMOUNTS.TABLE inside the formula.',
  },
} as const satisfies Record<string, ErrorTemplate>;
