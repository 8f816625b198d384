/** Errors of equilibrium constants. */
import type { ErrorTemplate } from '../errorTable.ts';

export const CONSTANT_ERRORS = {
  'constant-value': {
    says: '{given} is no equilibrium constant: {reason}',
    remedy: 'Correct it, or say how it is written in a row K written as.',
  },
  'constant-basis': {
    says: 'K is in terms of {basis}, and the medium is {medium}: {reason}',
    remedy: 'Correct the row K in terms of or the medium, or restate the constant with K.RESTATE.',
  },
  'constant-too-large': {
    says: 'ln K is {lnK}, so that K itself cannot be held in a cell',
    remedy: 'Work with ln K and the row K written as | ln K.',
  },
  'restate-rows': {
    says: 'the conditions have a row {row}, beside the terms that are given as arguments',
    remedy: 'Leave that row out of the conditions; K is given as a number in the terms `from`.',
  },
  'restate-terms': {
    says: '{argument} is "{given}", which names no terms of a constant',
    remedy: 'Write activity, pressure and its unit, concentration and its unit, or mole fraction.',
  },
} as const satisfies Record<string, ErrorTemplate>;
