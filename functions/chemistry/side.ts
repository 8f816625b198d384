import { inputError } from '../errors.ts';
import { ONE, printRational, type Rational, readRational } from './rational.ts';
import { parseSpecies, type Species } from './species.ts';
import { splitTerms } from './terms.ts';

/** A species with its coefficient in an equation. */
export interface Term {
  readonly species: Species;
  readonly coefficient: Rational;
}

/** A coefficient (whole, decimal or fraction) and the species after it. */
const TERM = /^(-?\d{1,9}(?:\.\d{1,9})?(?:\/\d{1,9}(?:\.\d{1,9})?)?) ?(?=[\p{L}([])([^]*)$/u;

const BEGINS_SPECIES = /^[\p{L}([]/u;

/** Terms as one side of an equation; the coefficient 1 is not printed. */
export function printSide(terms: readonly Term[]): string {
  return terms
    .map(({ coefficient, species }) => {
      const figures = printRational(coefficient);
      return figures === '1' ? species.text : `${figures} ${species.text}`;
    })
    .join(' + ');
}

/**
 * The terms on one side of an equation, in plain notation.
 *
 * Coefficients are whole numbers, decimals or fractions, with or without a space after them.
 * Errors: equation-side-empty, equation-term, equation-coefficient, and those of species.
 */
export function parseSide(text: string, side: 'left' | 'right', equation: string): Term[] {
  const trimmed = text.trim();
  if (trimmed === '') throw inputError('equation-side-empty', { side, text: equation });
  return splitTerms(trimmed).map((term, i) => parseTerm(term, { number: i + 1, side, term }));
}

function parseTerm(text: string, where: { number: number; side: string; term: string }): Term {
  if (text === '') throw inputError('equation-term', { ...where, reason: 'nothing stands beside a +' });
  if (BEGINS_SPECIES.test(text)) return { species: parseSpecies(text), coefficient: ONE };
  const found = TERM.exec(text);
  if (!found)
    throw inputError('equation-term', { ...where, reason: 'a coefficient and a species are wanted' });
  const figures = found[1]!;
  const isPositive = !figures.startsWith('-') && !/^[0.]+(?:\/|$)|\/[0.]+$/.test(figures);
  if (!isPositive) throw inputError('equation-coefficient', { ...where, coefficient: figures });
  return { species: parseSpecies(found[2]!), coefficient: readRational(figures) };
}
