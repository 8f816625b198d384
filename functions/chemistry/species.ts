import { inputError } from '../errors.ts';
import { ELECTRON, printCharge, splitCharge } from './charge.ts';
import { type Atoms, isElement, parseFormula } from './formula.ts';
import { plainNotation } from './notation.ts';
import { toNumber } from './rational.ts';
import { remember } from './remember.ts';
import { type PhaseTag, printTag, splitTag } from './tag.ts';

export interface Species extends PhaseTag {
  /** Canonical text with charge and tag: two texts of the same species give the same. */
  readonly text: string;
  /** Canonical text without the tag. */
  readonly name: string;
  /** Atoms in one formula unit by element; null for a named species. */
  readonly composition: ReadonlyMap<string, number> | null;
  /** The same, exactly. */
  readonly atoms: Atoms | null;
  /** Charge number; null for a named species without a written charge. */
  readonly charge: number | null;
}

/** A longer text is no species. */
const LONGEST_SPECIES = 120;

/**
 * Slips in capitals are looked for in short texts of common elements (`NAOH`): among longer words
 * and rarer elements they would catch abbreviations, such as THF for ThF.
 */
const LONGEST_MISWRITTEN = 6;
const COMMON = 'H Li B C N O F Na Mg Al Si P S Cl K Ca Ti Cr Mn Fe Co Ni Cu Zn Br Ag Sn I Ba Pb'.split(' ');

const WORDS = /^\p{L}+(?: \p{Ll}+)*$/u;
const NAME = /^(?![A-Z])\p{L}[\p{L}\p{N}_'-]*(?: [\p{Ll}\p{N}][\p{L}\p{N}_'-]*)*$/u;

/**
 * The species that a text stands for: a formula, or a name without composition, with an optional
 * tag for the phase: `CaCO3(s,calcite)`, `SO4^2-`, `CuSO4·5H2O`, `ester`, `HA`.
 *
 * ## Formula or name
 * 1. What begins with a small letter is a name (`ester`, `n-butane`, `acetic acid`), except the
 *    electron `e^-`.
 * 2. What begins with a capital and divides into element symbols is a formula. This takes in words
 *    that happen to divide (`CO`, `Pb`, `HAc` with actinium): write those small to mean a name.
 * 3. Letters alone that do not divide so are a name (`HA`, `A`, `M^2+`, `Water`), unless other
 *    capitals would make it a formula (`NaCL`, `MGO`): an error that shows it.
 * 4. Anything else must be a formula: `Xy2` and `CaCL2` are errors that name the unknown element.
 *
 * D and T stand for isotopes only inside a formula (`D2O`); alone they are names, as A and X are.
 * Errors: species-unreadable, name-or-formula, phase-unknown, and those of formula and charge.
 */
export const parseSpecies: (text: string) => Species = remember((written) => {
  const plain = plainNotation(written);
  if (plain === '') throw inputError('species-unreadable', { text: plain, reason: 'it is blank' });
  if (plain.length > LONGEST_SPECIES) {
    const text = `${plain.slice(0, 20)}...`;
    throw inputError('species-unreadable', {
      text,
      reason: `it is longer than ${LONGEST_SPECIES} characters`,
    });
  }
  const { untagged, tag } = splitTag(plain);
  const { body, charge } = splitCharge(untagged);
  const { text, atoms } = readBody(body, charge, plain);
  const name = text + printCharge(text, charge ?? 0);
  return {
    text: name + printTag(tag),
    name,
    ...tag,
    atoms,
    composition: atoms && new Map([...atoms].map(([symbol, count]) => [symbol, toNumber(count)])),
    charge: atoms ? (charge ?? 0) : charge,
  };
});

function readBody(body: string, charge: number | null, whole: string): { text: string; atoms: Atoms | null } {
  if (body === ELECTRON && charge === -1) return { text: body, atoms: new Map() };
  if (NAME.test(body)) return { text: body, atoms: null };
  if (WORDS.test(body) && !dividesIntoElements(body)) {
    const formula = inOtherCapitals(body);
    if (formula !== null) throw inputError('name-or-formula', { text: body, formula });
    return { text: body, atoms: null };
  }
  if (/^[A-Z([]/.test(body)) return parseFormula(body);
  throw inputError('species-unreadable', {
    text: whole,
    reason:
      body === '' ? 'nothing stands before the charge or tag' : `"${body}" is neither a formula nor a name`,
  });
}

function dividesIntoElements(letters: string): boolean {
  return /^(?:[A-Z][a-z]?)+$/.test(letters) && letters.match(/[A-Z][a-z]?/g)!.every(isElement);
}

/** The formula that the letters would be in other capitals, if they show that one was meant. */
function inOtherCapitals(letters: string): string | null {
  if (letters.length > LONGEST_MISWRITTEN || !/[A-Z].*[A-Z]/.test(letters)) return null;
  return divide(letters.toLowerCase());
}

function divide(letters: string): string | null {
  if (letters === '') return '';
  for (const length of [2, 1]) {
    const symbol = letters.charAt(0).toUpperCase() + letters.slice(1, length);
    if (symbol.length !== length || !COMMON.includes(symbol)) continue;
    const rest = divide(letters.slice(length));
    if (rest !== null) return symbol + rest;
  }
  return null;
}
