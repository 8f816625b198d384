/** Errors of amounts tables. */
import type { ErrorTemplate } from '../errorTable.ts';

export const AMOUNT_ERRORS = {
  'amounts-table': {
    says: '{argument} is {given}, but rows of species, amount, unit and standard uncertainty are wanted',
    remedy:
      'Give a range of two to four columns, or one row or column of numbers in the order of the equation.',
  },
  'amounts-species': {
    says: '{place} has {given} as its species',
    remedy: 'Give the name of the species as the equation writes it.',
  },
  'amounts-blank': {
    says: '{place} is blank, and this function has no amount to find',
    remedy: 'Give the amount, 0 where the species is absent.',
  },
  'amounts-number': {
    says: '{place} holds {given}, but a number is wanted',
    remedy: 'Give the amount as a number, its unit in the next column.',
  },
  'amounts-unit': {
    says: '{place} has {given} as its unit',
    remedy: 'Give the unit as a text such as mol, in the third column.',
  },
  'amounts-uncertainty': {
    says: '{place} has {given} as its standard uncertainty',
    remedy: 'Give a number of 0 or more in the unit of the amount, or leave it blank.',
  },
  'heading-unit': {
    says: 'the heading of {argument} holds a unit in {given}, which is not read there',
    remedy: 'Give the unit of each row in the third column.',
  },
  'heading-uncertainty': {
    says: '{argument} has {given} as the heading of its uncertainties',
    remedy: 'Write standard uncertainty, or expanded uncertainty (k=2).',
  },
  'amounts-missing': {
    says: 'the amounts have no line for {missing}{others}',
    remedy: 'Give every species of the equation a line; type 0 where it is absent.',
  },
  'amounts-twice': {
    says: '{place} names the same species as {first}',
    remedy: 'Keep one of the two.',
  },
  'amounts-count': {
    says: 'the amounts are {given} numbers, and the equation has {wanted} species',
    remedy: 'Give one number for each, in the order {species}, or label them.',
  },
  'amounts-negative': {
    says: '{place} is {amount}; an amount cannot be negative',
    remedy:
      'Give 0 or more; where it is taken out, EXTENT.SOLVE and COMPOSITION.AT.EQUILIBRIUM accept it with a conditions row removal | allowed.',
  },
  'amounts-unit-kind': {
    says: '{place} has the unit {unit}, which measures no amount of a species',
    remedy: 'Give mol, kg, mol/L, bar, mol % or another unit of amount.',
  },
  'amounts-mixed': {
    says: '{first}, {second}; they cannot stand in one calculation',
    remedy: 'Give all amounts in units of one kind.',
  },
  'amounts-as-given': {
    says: '{place} is in {unit}, while K speaks of the amounts as given in another unit',
    remedy: 'Give all species in one unit, or state a medium.',
  },
  'amounts-fraction': {
    says: '{place} is in {unit}, which may mean moles or mass of what is no gas',
    remedy: 'Write mol % or mol/mol, or give mol or kg.',
  },
  'amounts-dissolved': {
    says: '{place} is dissolved and given in {unit}, and nothing says that K is in terms of it too',
    remedy:
      'State medium | solution where K is in mol/L, or K in terms of | concentration | {unit}, or medium | as given.',
  },
  'amounts-basis': {
    says: 'the amounts are in {unit}, which does not fit {medium}',
    remedy: 'Give them in {wanted}.',
  },
  'amounts-unlabelled': {
    says: 'the amounts have no species beside them',
    remedy: 'Give a table whose first column names the species.',
  },
} as const satisfies Record<string, ErrorTemplate>;
