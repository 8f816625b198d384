import { inputError } from '../errors.ts';
import { imbalances } from './conservation.ts';
import { parseEquation, type Reaction } from './equation.ts';
import { remember } from './remember.ts';

export interface CheckedReaction extends Reaction {
  /** Not checked where a species is a name without composition. */
  readonly check: 'balanced' | 'not checked';
  /** The species that prevented the check. */
  readonly named: readonly string[];
}

/**
 * The reaction of an equation text, its elements and charge checked.
 *
 * The sums are exact: a decimal means what it says, so that a third is written 1/3. An equation with
 * a named species is not checked at all, because the name may hold any elements.
 * Errors: equation-unbalanced, naming each element and by how much, and those of `parseEquation`.
 */
export const balancedEquation: (text: string) => CheckedReaction = remember((text) => {
  const reaction = parseEquation(text);
  const named = reaction.species.filter((species) => species.atoms === null).map((species) => species.text);
  if (named.length > 0) return { ...reaction, check: 'not checked', named };
  const found = imbalances(reaction);
  if (found.length > 0) {
    throw inputError('equation-unbalanced', { equation: reaction.text, differences: found.join('; ') });
  }
  return { ...reaction, check: 'balanced', named };
});
