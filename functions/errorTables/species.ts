/** Errors of the formulas and names of species. */
import type { ErrorTemplate } from '../errorTable.ts';

export const SPECIES_ERRORS = {
  'species-unreadable': {
    says: '"{text}" cannot be read as a species: {reason}',
    remedy:
      'Write a formula such as SO4^2-, or a name that begins with a small letter, each with its phase if need be: (g), (l), (s), (aq).',
  },
  'formula-unreadable': {
    says: '"{text}" cannot be read as a formula: {reason}, at character {position}',
    remedy:
      'Write element symbols with their counts, groups in ( ) or [ ], water as ·5H2O; or begin the text with a small letter if it is a name.',
  },
  'formula-two-readings': {
    says: '"{text}" can be read in two ways, as {first} or as {second}',
    remedy: 'Write the one that is meant.',
  },
  'element-unknown': {
    says: '{symbol}, at character {position} of "{text}", is no element',
    remedy: 'Correct the symbol, or begin the text with a small letter if it is a name and no formula.',
  },
  'name-or-formula': {
    says: '{text} is no formula as it is written, but {formula} is one',
    remedy: 'Write {formula}, or begin the text with a small letter if it is a name.',
  },
  isotope: {
    says: '"{text}" names an isotope, and weights and equilibrium data are held for the elements of nature only',
    remedy:
      'Write the element without its mass number (H for D and T), or give a name that begins with a small letter.',
  },
  'charge-unreadable': {
    says: '{charge} in "{text}" cannot be read as a charge',
    remedy: 'Write a number and a sign after ^ such as Ca^2+, or the sign alone for one charge such as Na+.',
  },
  'phase-unknown': {
    says: '{tag} in "{text}" is no phase',
    remedy: 'Write (g), (l), (s) or (aq) in small letters; a solid may say which, as in CaCO3(s,calcite).',
  },
  'composition-missing': {
    says: '{species} is a name without a formula, and {purpose} needs its elements',
    remedy: 'Write its formula.',
  },
  'weight-missing': {
    says: '{element} has no standard atomic weight, so {species} has no molar mass',
    remedy: 'Give amounts of {species} in mol.',
  },
  'charge-missing': {
    says: '{species} has no charge, and {unit} counts charges',
    remedy: 'Give {species} in mol or in mass.',
  },
} as const satisfies Record<string, ErrorTemplate>;
