import { inputError } from '../errors.ts';
import { remember } from './remember.ts';
import { parseSpecies, type Species } from './species.ts';

interface HasSpecies {
  readonly species: readonly Species[];
}

interface Match {
  readonly index: number | null;
}

/** Labels remembered for one reaction: its species, in the spellings of a few tables. */
const LABELS_REMEMBERED = 200;

const matchers = new WeakMap<readonly Species[], (label: string) => Match>();

/**
 * The place in a reaction's species that a label stands for; null where it stands for none.
 *
 * ## Method
 * 1. The species with the same canonical text.
 * 2. Otherwise those with the same name whose tags agree, a tag that is not written agreeing with any:
 *    `NH3` stands for `NH3(g)`, and `CaCO3(s)` for `CaCO3(s,calcite)`, when only one is possible.
 *
 * Errors: species-two-readings where several are possible, and those of `parseSpecies`.
 */
export function matchSpecies(reaction: HasSpecies, label: string): number | null {
  let matcher = matchers.get(reaction.species);
  if (matcher === undefined) {
    matcher = matcherFor(reaction.species);
    matchers.set(reaction.species, matcher);
  }
  return matcher(label).index;
}

function matcherFor(all: readonly Species[]): (label: string) => Match {
  return remember((label) => {
    const wanted = parseSpecies(label);
    const same = all.findIndex((species) => species.text === wanted.text);
    if (same >= 0) return { index: same };
    const candidates = all.filter((species) => mayBe(species, wanted));
    if (candidates.length > 1) {
      const texts = candidates.map((species) => species.text).join(', ');
      throw inputError('species-two-readings', { label: wanted.text, candidates: texts });
    }
    return { index: candidates.length === 1 ? all.indexOf(candidates[0]!) : null };
  }, LABELS_REMEMBERED);
}

function mayBe(a: Species, b: Species): boolean {
  return a.name === b.name && agree(a.phase, b.phase) && agree(a.form, b.form);
}

function agree(a: string | null, b: string | null): boolean {
  return a === null || b === null || a === b;
}
