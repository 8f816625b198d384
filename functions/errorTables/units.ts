/** Errors of units. */
import type { ErrorTemplate } from '../errorTable.ts';

export const UNIT_ERRORS = {
  'unit-unknown': {
    says: '"{unit}" is no unit that is known here{suggestion}',
    remedy:
      'Write a unit such as mol, kmol/h, mg/L, bar or degC; units are case-sensitive, and divisors of several stand in brackets, as in J/(mol K).',
  },
  'unit-reference': {
    says: '"{unit}" does not say at which temperature and pressure the volume is taken',
    remedy:
      'Write {volume}(0 degC, 1.01325 bar), {volume}(0 degC, 1 bar), {volume}(15 degC, 1.01325 bar) or whichever is meant.',
  },
  'unit-incompatible': {
    says: '{from} ({fromQuantity}) cannot be converted to {to} ({toQuantity})',
    remedy: 'Give two units of the same quantity.',
  },
  'unit-not-expressible': {
    says: '{unit} has no meaning: {reason}',
    remedy:
      'Write a mass or a mass per litre as a formula that holds one element besides O and H, such as mg/L as N, or mg/L as CaCO3.',
  },
  'unit-not-molar': {
    says: '{unit} cannot be turned into an amount of {species}: {reason}',
    remedy: 'Give {species} in mol, mol/L or mol %.',
  },
} as const satisfies Record<string, ErrorTemplate>;
