/** Answers that cannot be given, and why. */
import type { ErrorTemplate } from '../errorTable.ts';

export const ANSWER_ERRORS = {
  'equation-not-checked': {
    says: 'the balance of {equation} cannot be checked: {named} without a formula',
    remedy: 'Write formulas where the elements are to be checked.',
  },
  'quotient-undefined': {
    says: 'Q has no number because a {which} is absent ({absent})',
    remedy: 'Use REACTION.DIRECTION, which tells which way it runs all the same.',
  },
  'quotient-too-large': {
    says: 'ln Q is {lnQ}, so that Q itself cannot be held in a cell',
    remedy: 'Use REACTION.REDUCED.AFFINITY, which gives ln(K/Q).',
  },
  'affinity-infinite': {
    says: 'the affinity has no number because a species is absent ({absent})',
    remedy: 'Use REACTION.DIRECTION, which tells which way it runs all the same.',
  },
  'reaction-blocked': {
    says: '{equation} can run neither way: a reactant and a product are absent',
    remedy: 'Check the amounts.',
  },
  'uncertainty-missing': {
    says: 'no uncertainty is given, so that there is no probability',
    remedy:
      'Add standard uncertainties to the amounts or the conditions, or the row K uncertainty (in ln K).',
  },
  'problem-unfit': {
    says: 'there is no answer: {reason}',
    remedy: 'Correct the amounts, the coefficients or the constant that this names.',
  },
  'not-solved': {
    says: 'the equilibrium was not worked ({status}): {reason}',
    remedy: 'Correct the amounts, the coefficients or the constant that this names.',
  },
  'extent-infeasible': {
    says: 'the extent {extent} makes an amount negative; it may be {lowest} to {highest}',
    remedy: 'Give an extent between them, or take it from EXTENT.SOLVE.',
  },
  'evidence-item': {
    says: 'the evidence has no item "{item}"',
    remedy: 'Its items are {items}.',
  },
  'phase-unknown-line': {
    says: '{place} has no phase tag, so that it is not known whether it is in the phase asked for',
    remedy: 'Tag it with (g), (l), (s) or (aq).',
  },
  'phase-word': {
    says: 'the phase is "{phase}"',
    remedy: 'Write g, l, s or aq.',
  },
  'left-out-missing': {
    says: '{species} is to be left out, but no line of the amounts is it',
    remedy: 'Name a species of the table.',
  },
  'fractions-nothing': {
    says: 'nothing is counted, or all that is counted is 0',
    remedy: 'Check the phase, the species left out and the amounts.',
  },
  'conversion-species': {
    says: '{species} is no reactant of {equation}',
    remedy: 'Name a species on the left side.',
  },
  'conversion-nothing-fed': {
    says: 'there is no {species} to convert',
    remedy: 'Feed some, or name another reactant.',
  },
  'table-strip': {
    says: '{argument} is a range of {size}',
    remedy: 'Give one row or one column.',
  },
  'table-length': {
    says: '{argument} has {given} cells, and the species {wanted}, lying {lies}',
    remedy: 'Give as many, lying the same way.',
  },
  'table-units': {
    says: 'uncertainties are given without units',
    remedy: 'Give the units before them.',
  },
} as const satisfies Record<string, ErrorTemplate>;
