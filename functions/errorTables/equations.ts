/** Errors of equations and their balance. */
import type { ErrorTemplate } from '../errorTable.ts';

export const EQUATION_ERRORS = {
  'equation-too-long': {
    says: 'the equation has {length} characters, more than {limit}',
    remedy: 'Split it into simpler reactions.',
  },
  'equation-sign': {
    says: '"{text}" has {count} reaction signs, and one is wanted',
    remedy: 'Write reactants = products, as in N2 + 3 H2 = 2 NH3.',
  },
  'equation-side-empty': {
    says: 'nothing stands on the {side} of "{text}"',
    remedy: 'Write at least one species on each side of the reaction sign.',
  },
  'equation-term': {
    says: 'term {number} on the {side} of the equation, "{term}", cannot be read: {reason}',
    remedy: 'Write terms such as 2 NH3(g) or 1/2 O2, with + between them and decimal points, not commas.',
  },
  'equation-coefficient': {
    says: 'term {number} on the {side} of the equation, "{term}", has the coefficient {coefficient}',
    remedy:
      'Give a coefficient above 0; a species that is used up stands on the left, one that is made on the right.',
  },
  'equation-doubled': {
    says: '{species} stands in the equation twice ({where})',
    remedy:
      'Write it once, with the difference of its coefficients; tell phases apart by (g), (l), (s), (aq).',
  },
  'equation-unbalanced': {
    says: '{equation} does not balance: {differences}',
    remedy:
      'Correct coefficients or formulas (a third is written 1/3), or begin a species with a small letter if it is a name.',
  },
  'balance-none': {
    says: 'no coefficients balance {equation}: {reason}',
    remedy: 'Check the formulas, or add the species that is missing.',
  },
  'balance-not-unique': {
    says: '{equation} can be balanced in {count} independent ways',
    remedy: 'Split it into {count} reactions, or leave species out until one way is left.',
  },
  'species-two-readings': {
    says: '{label} can be any of {candidates}',
    remedy: 'Write the one that is meant, with its phase.',
  },
} as const satisfies Record<string, ErrorTemplate>;
