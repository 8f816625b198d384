import { add, isZero, multiply, printRational, rational, type Rational, subtract, ZERO } from './rational.ts';
import type { Reaction } from './equation.ts';
import type { Species } from './species.ts';

/** What a reaction conserves of a species with composition: its atoms, and its charge. */
export function conserved(species: Species): Map<string, Rational> {
  return new Map([...species.atoms!, ['charge', rational(BigInt(species.charge!))]]);
}

/** A phrase for each element or charge whose sums differ on the two sides; none where all balance. */
export function imbalances({ species, coefficients, reactantCount }: Reaction): string[] {
  const left = new Map<string, Rational>();
  const right = new Map<string, Rational>();
  species.forEach((one, i) => {
    const sum = i < reactantCount ? left : right;
    for (const [what, count] of conserved(one)) {
      sum.set(what, add(sum.get(what) ?? ZERO, multiply(coefficients[i]!, count)));
    }
  });
  return [...new Set([...left.keys(), ...right.keys()])].flatMap((what) => {
    const [a, b] = [left.get(what) ?? ZERO, right.get(what) ?? ZERO];
    return isZero(subtract(a, b))
      ? []
      : `${what}: ${printRational(a)} on the left, ${printRational(b)} on the right`;
  });
}
