import { type Details, fillTemplate } from './errorTable.ts';

/**
 * Every error that a person's input can cause: its code, what it says, and how to mend it.
 *
 * A message reads `<says>. <remedy>`; words in braces are filled in by `inputError`, and the
 * compiler checks that each is given. The plugin puts the name of the cell function in front.
 * Errors that no input can cause are not here: they are assertions.
 */
const TABLE = {
  // values handed to a cell function
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
  // conditions tables
  'condition-table': {
    says: '{argument} is {given}, but rows of quantity, value, unit and standard uncertainty are wanted',
    remedy: 'Give a range of two to four columns, or CONDITIONS.TABLE("temperature", 350, "K").',
  },
  'condition-unknown': {
    says: '{argument} row {row} names {given}, which is no condition',
    remedy: 'The conditions are {names}.',
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
  // amounts tables
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
    says: '{place} is blank; a blank means an amount to be found, and this function finds none',
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
  'amounts-heading': {
    says: 'the amounts have {given} as the heading of their uncertainties',
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
    remedy: 'Give 0 or more, or state removal | allowed among the conditions where it is taken out.',
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
  'amounts-basis': {
    says: 'the amounts are in {unit}, which does not fit {medium}',
    remedy: 'Give them in {wanted}.',
  },
  'amounts-unlabelled': {
    says: 'the amounts have no species beside them',
    remedy: 'Give a table whose first column names the species.',
  },
  // the medium and what it needs
  'medium-contradiction': {
    says: '{what}',
    remedy: '{mend}.',
  },
  'medium-tags-forgotten': {
    says: 'the conditions give a {row}, but in {equation} nothing is tagged as a gas and no medium is stated',
    remedy: 'Tag the gases with (g), or add a row medium | gas, solution or ideal liquid.',
  },
  'medium-missing': {
    says: 'the amount of gas changes by {change} in {equation}, so that the answer depends on the pressure or the volume',
    remedy:
      'Add a pressure row or a volume row, or medium | as given where the amounts are activities already.',
  },
  'medium-liquids': {
    says: '{equation} has several liquids, which may be mixed or apart',
    remedy: 'Add the row medium | ideal liquid where they are one solution.',
  },
  'medium-untagged': {
    says: '{species} has no phase tag in {equation}, where others are gases',
    remedy: 'Tag it with (g), (l) or (s), or add the row medium | gas.',
  },
  'medium-unknown': {
    says: 'nothing says in which medium the constant of {equation} is stated',
    remedy: 'Tag the species with (g) or (aq), or add a medium row.',
  },
  'condition-missing': {
    says: 'the conditions have no {name} row, which is needed for {purpose}',
    remedy: 'Add the row {name} with its unit.',
  },
  'condition-range': {
    says: 'the {name} is {value} in base units, but it must be greater than 0',
    remedy: 'Correct the {name} row.',
  },
  'condition-inert': {
    says: 'the conditions hold {name} out of reaction, but it is no line of the amounts beside {equation}',
    remedy: 'Name a species that is fed and is not in the equation.',
  },
  'temperature-range': {
    says: '{argument} is {value}, which is not above absolute zero',
    remedy: 'Give a temperature above 0 K, or its unit.',
  },
  // constants
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
  'restate-terms': {
    says: '{argument} is "{given}", which names no terms of a constant',
    remedy: 'Write activity, pressure and its unit, concentration and its unit, or mole fraction.',
  },
  // answers that cannot be given
  'equation-not-checked': {
    says: 'the balance of {equation} cannot be checked: {named} without a formula',
    remedy: 'Write formulas where the elements are to be checked.',
  },
  'quotient-undefined': {
    says: 'Q has no number because a {which} is absent ({absent})',
    remedy: 'Use REACTION.DIRECTION, which tells which way it runs all the same.',
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
  'not-solved': {
    says: 'the equilibrium was not found: {status}, {reason}',
    remedy: 'EXTENT.EVIDENCE with the same arguments tells more.',
  },
  'extent-infeasible': {
    says: 'the extent {extent} makes an amount negative; it may be {lowest} to {highest}',
    remedy: 'Give an extent between them, or take it from EXTENT.SOLVE.',
  },
  'evidence-item': {
    says: 'the evidence has no item "{item}"',
    remedy: 'Its items are {items}.',
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

  // formulas and names of species
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

  // equations
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

  // units
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
} as const;

export type ErrorCode = keyof typeof TABLE;

/** An error of the person's input. Thrown by readers and parsers, shown in the cell that asked. */
export class InputError extends Error {
  override readonly name = 'InputError';
  readonly code: string;
  constructor(code: string, message: string) {
    super(message);
    this.code = code;
  }
}

/** Whether this is an error of the input; own functions may bring another copy of the class. */
export function isInputError(thrown: unknown): thrown is InputError {
  return thrown instanceof Error && thrown.name === 'InputError' && 'code' in thrown;
}

/**
 * The error with this code, its message filled in.
 *
 * `throw inputError('argument-kind', { argument: 'K', given: 'the text "high"', wanted: 'a number' })`
 */
export function inputError<Code extends ErrorCode>(
  code: Code,
  details: Details<(typeof TABLE)[Code]>,
): InputError {
  return new InputError(code, fillTemplate(TABLE[code], details));
}

/** What `read` gives; an error of the input that it throws is told with its place in front. */
export function at<Read>(place: () => string, read: () => Read): Read {
  try {
    return read();
  } catch (thrown) {
    throw isInputError(thrown) ? new InputError(thrown.code, `${place()}: ${thrown.message}`) : thrown;
  }
}

/** Code, template and remedy of every error, for the reference page. */
export function errorTable(): { code: ErrorCode; says: string; remedy: string }[] {
  return Object.entries(TABLE).map(([code, { says, remedy }]) => ({ code: code as ErrorCode, says, remedy }));
}
