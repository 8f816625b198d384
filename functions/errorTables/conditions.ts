/** Errors of conditions tables. */
import type { ErrorTemplate } from '../errorTable.ts';

export const CONDITION_ERRORS = {
  'condition-table': {
    says: '{argument} is {given}, but rows of quantity, value, unit and standard uncertainty are wanted',
    remedy: 'Give a range of two to four columns, or CONDITIONS.TABLE("temperature", 350, "K").',
  },
  'condition-unknown': {
    says: '{argument} row {row} names {given}, which is no condition',
    remedy: '{suggestion}The conditions are {names}.',
  },
  'condition-twice': {
    says: '{argument} row {row} gives {name} again; row {first} gave it first',
    remedy: 'Keep one of the two rows.',
  },
  'condition-value': {
    says: '{place} holds {given}, but {wanted} is wanted',
    remedy: 'Give {wanted} in its second column.',
  },
  'condition-unit': {
    says: '{place} has {given}, but {wanted} is wanted',
    remedy: 'Give {wanted} in its third column.',
  },
  'condition-uncertainty': {
    says: '{place} has {given} as its standard uncertainty',
    remedy:
      'Give a number of 0 or more in its fourth column, on a row that holds a measured number, or leave it blank.',
  },
  'condition-uncertainty-alone': {
    says: '{place} gives an uncertainty of {of}, but no measured {of} is given',
    remedy: 'Add the row {of}, or take this one out.',
  },
} as const satisfies Record<string, ErrorTemplate>;
