import { inputError } from '../errors.ts';
import { plainNotation } from './notation.ts';
import { type Rational, toNumber } from './rational.ts';
import { remember } from './remember.ts';
import { parseSide, printSide, type Term } from './side.ts';
import type { Species } from './species.ts';

export interface Reaction {
  /** Canonical text: `N2(g) + 3 H2(g) = 2 NH3(g)`. */
  readonly text: string;
  /** In the order of the text. */
  readonly species: readonly Species[];
  /** Coefficients in the same order, products positive. */
  readonly stoichiometry: readonly number[];
  /** The coefficients without sign, exactly. */
  readonly coefficients: readonly Rational[];
  /** How many of the species are reactants; they come first. */
  readonly reactantCount: number;
}

const LONGEST_EQUATION = 1000;

const REACTION_SIGN = /<=>|<->|->|=|[⇌⇋⇄⇆→↔]/;

/**
 * The reaction that an equation text describes: `N2(g) + 3 H2(g) = 2 NH3(g)`.
 *
 * `=`, `<=>`, `<->`, `->` and the arrows and double harpoons are all the same reversible sign.
 * Coefficients are whole numbers, decimals or fractions, with or without a space after them.
 * Whether it balances is not asked here: see `balancedEquation`.
 * Errors: equation-too-long, -sign, -side-empty, -term, -coefficient, -doubled, and those of species.
 */
export const parseEquation: (text: string) => Reaction = remember((written) => {
  if (written.length > LONGEST_EQUATION) {
    throw inputError('equation-too-long', { length: written.length, limit: LONGEST_EQUATION });
  }
  const plain = plainNotation(written);
  const sides = plain.split(REACTION_SIGN);
  if (sides.length !== 2) throw inputError('equation-sign', { text: plain, count: sides.length - 1 });
  const left = parseSide(sides[0]!, 'left', plain);
  const right = parseSide(sides[1]!, 'right', plain);
  refuseDoubled(left, right);
  const terms = [...left, ...right];
  return {
    text: `${printSide(left)} = ${printSide(right)}`,
    species: terms.map((term) => term.species),
    stoichiometry: terms.map(({ coefficient }, i) => (i < left.length ? -1 : 1) * toNumber(coefficient)),
    coefficients: terms.map((term) => term.coefficient),
    reactantCount: left.length,
  };
});

function refuseDoubled(left: readonly Term[], right: readonly Term[]): void {
  const sideOf = new Map<string, string>();
  for (const [terms, side] of [
    [left, 'left'],
    [right, 'right'],
  ] as const) {
    for (const { species } of terms) {
      const first = sideOf.get(species.text);
      if (first !== undefined) {
        const where = first === side ? `both on the ${side}` : 'once on each side';
        throw inputError('equation-doubled', { species: species.text, where });
      }
      sideOf.set(species.text, side);
    }
  }
}
