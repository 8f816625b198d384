/** A reaction as TeX, with the reversible double harpoon whatever sign was typed. */
import type { Reaction } from '../../../functions/chemistry/equation.ts';
import { printRational, type Rational } from '../../../functions/chemistry/rational.ts';
import { speciesTex } from './speciesTex.ts';

export function equationTex({ species, coefficients, reactantCount }: Reaction): string {
  const terms = species.map((one, index) => coefficientTex(coefficients[index]) + speciesTex(one));
  const side = (from: number, to?: number) => terms.slice(from, to).join(' + ');
  return `${side(0, reactantCount)} \\rightleftharpoons ${side(reactantCount)}`;
}

function coefficientTex(coefficient: Rational | undefined): string {
  if (coefficient === undefined) throw new Error('invariant: every species has a coefficient');
  const [over, under] = printRational(coefficient).split('/');
  if (under !== undefined) return `\\tfrac{${over}}{${under}}\\,`;
  return over === '1' ? '' : `${over}\\,`;
}
