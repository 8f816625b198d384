import { inputError } from '../errors.ts';
import { conserved } from './conservation.ts';
import { parseEquation, type Reaction } from './equation.ts';
import { nullSpace } from './nullSpace.ts';
import { greatestCommonDivisor, type Rational, rational, ZERO } from './rational.ts';
import { printSide } from './side.ts';
import type { Species } from './species.ts';

/**
 * The equation with the smallest whole coefficients that balance its elements and charge.
 *
 * Coefficients that the text has already are not used.
 *
 * ## Method
 * 1. A row for each element and for charge, a column for each species, products negative.
 * 2. Its null space in exact arithmetic: one vector, or the equation has no balance or several.
 * 3. The vector times the least common denominator, by the greatest common divisor. A species whose
 *    sign differs from the others' would stand on the other side: an error.
 *
 * Errors: composition-missing, balance-none, balance-not-unique, and those of `parseEquation`.
 */
export function balanceEquation(text: string): string {
  const reaction = parseEquation(text);
  const vectors = nullSpace(conservationMatrix(reaction));
  if (vectors.length > 1) {
    throw inputError('balance-not-unique', { equation: reaction.text, count: vectors.length });
  }
  if (vectors.length === 0) {
    throw none(reaction, 'elements and charge cannot all be equal on both sides');
  }
  const coefficients = smallestWhole(vectors[0]!);
  refuseOtherSide(reaction, coefficients);
  const terms = reaction.species.map((species, i) => ({
    species,
    coefficient: rational(magnitude(coefficients[i]!)),
  }));
  const { reactantCount } = reaction;
  return `${printSide(terms.slice(0, reactantCount))} = ${printSide(terms.slice(reactantCount))}`;
}

function conservationMatrix({ species, reactantCount }: Reaction): Rational[][] {
  for (const { atoms, text } of species) {
    if (atoms === null) throw inputError('composition-missing', { species: text, purpose: 'balancing' });
  }
  const columns = species.map(conserved);
  const whats = new Set(columns.flatMap((column) => [...column.keys()]));
  return [...whats].map((what) =>
    columns.map((column, i) => {
      const { numerator, denominator } = column.get(what) ?? ZERO;
      return { numerator: i < reactantCount ? numerator : -numerator, denominator };
    }),
  );
}

function smallestWhole(vector: readonly Rational[]): bigint[] {
  const multiple = vector.reduce((all, { denominator }) => {
    return (all / greatestCommonDivisor(all, denominator)) * denominator;
  }, 1n);
  const whole = vector.map(({ numerator, denominator }) => numerator * (multiple / denominator));
  const divisor = whole.reduce(greatestCommonDivisor, 0n);
  return whole.map((coefficient) => coefficient / divisor);
}

/** Either all coefficients have one sign, or the fewer that have the other are named. */
function refuseOtherSide(reaction: Reaction, coefficients: readonly bigint[]): void {
  const withSign = (isWanted: (coefficient: bigint) => boolean) =>
    reaction.species.filter((_, i) => isWanted(coefficients[i]!));
  const idle = withSign((coefficient) => coefficient === 0n);
  if (idle.length > 0) throw none(reaction, `${list(idle)} would take no part`);
  const positive = withSign((coefficient) => coefficient > 0n);
  const negative = withSign((coefficient) => coefficient < 0n);
  const fewer = negative.length <= positive.length ? negative : positive;
  if (fewer.length > 0) throw none(reaction, `${list(fewer)} would have to stand on the other side`);
}

function none(reaction: Reaction, reason: string) {
  return inputError('balance-none', { equation: reaction.text, reason });
}

function list(species: readonly Species[]): string {
  return species.map(({ text }) => text).join(', ');
}

function magnitude(a: bigint): bigint {
  return a < 0n ? -a : a;
}
