import { ATOMIC_WEIGHTS } from '../data/atomicWeights.ts';
import { inputError } from '../errors.ts';
import { add, multiply, readRational, toNumber, ZERO } from './rational.ts';
import type { Species } from './species.ts';

const known = new WeakMap<Species, number>();

/**
 * Molar mass in g/mol: the sum of the standard atomic weights, exact in their decimals.
 *
 * The mass of electrons gained or lost is left out (5.5e-4 g/mol each, below the last digit of the
 * abridged weights for all but the lightest ions); that of the electron itself comes out as 0.
 * Errors: composition-missing, weight-missing.
 */
export function molarMass(species: Species): number {
  const remembered = known.get(species);
  if (remembered !== undefined) return remembered;
  if (species.atoms === null) {
    throw inputError('composition-missing', { species: species.text, purpose: 'a molar mass' });
  }
  let sum = ZERO;
  for (const [element, count] of species.atoms) {
    const weight = ATOMIC_WEIGHTS.get(element);
    if (!weight) throw inputError('weight-missing', { element, species: species.text });
    sum = add(sum, multiply(count, readRational(String(weight.gramPerMol))));
  }
  const gramPerMol = toNumber(sum);
  known.set(species, gramPerMol);
  return gramPerMol;
}
