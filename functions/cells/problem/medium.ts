/**
 * Which medium a reaction runs in, and which of its species are mixed in it.
 *
 * The medium follows from the phase tags and the conditions by fixed rules, and where they leave
 * room for two readings it is an error: a pressure that nobody uses, or a gas without one, would
 * otherwise give a number on the wrong basis.
 */
import type { Reaction } from '../../chemistry/equation.ts';
import type { Species } from '../../chemistry/species.ts';
import { inputError } from '../../errors.ts';
import type { Conditions } from '../reading/conditions.ts';
import { rememberPair } from './rememberPair.ts';

export type Medium = 'as given' | 'gas' | 'solution' | 'ideal liquid';

export interface Setting {
  readonly medium: Medium;
  /** For each species of the equation: whether it is mixed in the medium; otherwise it is a pure phase. */
  readonly mixed: readonly boolean[];
  /** Sum of the stoichiometric numbers of the mixed species; exactly 0 where only rounding is left. */
  readonly change: number;
  /** Whether activities are fractions of all that is mixed, and not amounts on a scale. */
  readonly isFraction: boolean;
  /** The species of the equation in words. */
  readonly species: readonly string[];
}

/** Tags that are mixed in a medium, and tags that stand beside it as pure phases; any other is an error. */
const PHASES: Readonly<Record<Medium, { mixed: readonly string[]; pure: readonly string[] }>> = {
  'as given': { mixed: ['g', 'aq', ''], pure: ['s', 'l'] },
  gas: { mixed: ['g', ''], pure: ['s', 'l'] },
  solution: { mixed: ['aq', ''], pure: ['s', 'l'] },
  'ideal liquid': { mixed: ['l', ''], pure: ['s'] },
};

/**
 * The medium of a reaction under these conditions.
 *
 * Errors: `medium-two-rows` (a gas with pressure and volume), `medium-as-given` and `medium-phase` (rows
 * or tags that exclude the medium), `medium-tags-forgotten` (a pressure or a volume that nothing uses),
 * `medium-missing` (a gas reaction without either), `medium-liquids` (several liquids, mixed or not),
 * `medium-untagged`.
 */
export const settingOf = rememberPair((conditions: Conditions, reaction: Reaction): Setting => {
  const stated = conditions.rows.get('medium')?.value as Medium | undefined;
  const hasPressure = conditions.rows.has('pressure');
  const hasVolume = conditions.rows.has('volume');
  const hasGas = reaction.species.some(({ phase }) => phase === 'g');
  const medium = stated ?? (hasGas && (hasPressure || hasVolume) ? 'gas' : 'as given');
  if (medium === 'gas' && hasPressure && hasVolume) {
    throw inputError('medium-two-rows', { equation: reaction.text });
  }
  if (medium === 'as given' && (hasPressure || hasVolume)) {
    const row = hasPressure ? 'pressure' : 'volume';
    if (stated === undefined) throw inputError('medium-tags-forgotten', { row, equation: reaction.text });
    throw inputError('medium-as-given', { row });
  }
  const setting = settingIn(medium, stated, reaction, hasVolume);
  checkGas(reaction, medium, stated, hasPressure || hasVolume);
  return setting;
});

function settingIn(
  medium: Medium,
  stated: Medium | undefined,
  reaction: Reaction,
  hasVolume: boolean,
): Setting {
  const mixed = reaction.species.map((species) => isMixed(species, medium, stated, reaction));
  const change = reaction.stoichiometry.reduce((sum, nu, i) => (mixed[i] ? sum + nu : sum), 0);
  return {
    medium,
    mixed,
    change: Math.abs(change) < ROUNDED_SUM ? 0 : change,
    isFraction: medium === 'ideal liquid' || (medium === 'gas' && !hasVolume),
    species: reaction.species.map(({ text }) => text),
  };
}

/**
 * The medium in which a constant is stated, where nothing runs: it follows from the phase tags unless
 * the conditions state it. Errors: `medium-unknown`, and those of the tags.
 */
export function constantSetting(reaction: Reaction, conditions: Conditions): Setting {
  const stated = conditions.rows.get('medium')?.value as Medium | undefined;
  const phases = reaction.species.map(({ phase }) => phase);
  const medium = stated ?? (phases.includes('g') ? 'gas' : phases.includes('aq') ? 'solution' : undefined);
  if (medium === undefined) throw inputError('medium-unknown', { equation: reaction.text });
  return settingIn(medium, stated, reaction, false);
}

/** Whether a species that is not in the equation is mixed in the medium. */
export function countsInMedium(species: Species, medium: Medium): boolean {
  return PHASES[medium].mixed.includes(species.phase ?? '');
}

function isMixed(species: Species, medium: Medium, stated: Medium | undefined, reaction: Reaction): boolean {
  const tag = species.phase ?? '';
  if (tag === '' && medium === 'gas' && stated === undefined) {
    throw inputError('medium-untagged', { species: species.text, equation: reaction.text });
  }
  if (PHASES[medium].mixed.includes(tag)) return true;
  if (!PHASES[medium].pure.includes(tag)) {
    throw inputError('medium-phase', { species: species.text, medium });
  }
  const isSeveralLiquids = tag === 'l' && reaction.species.filter(({ phase }) => phase === 'l').length > 1;
  if (medium === 'as given' && isSeveralLiquids)
    throw inputError('medium-liquids', { equation: reaction.text });
  return false;
}

/** A gas whose total amount changes needs to know what stays constant, unless activities are given as such. */
function checkGas(reaction: Reaction, medium: Medium, stated: Medium | undefined, isBounded: boolean): void {
  const isGas = medium === 'gas' || (medium === 'as given' && stated === undefined);
  if (!isGas || isBounded) return;
  const gasChange = reaction.stoichiometry.reduce((sum, nu, i) => {
    const { phase } = reaction.species[i]!;
    return phase === 'g' || (phase === null && medium === 'gas') ? sum + nu : sum;
  }, 0);
  if (Math.abs(gasChange) > ROUNDED_SUM) {
    throw inputError('medium-missing', { equation: reaction.text, change: signed(gasChange) });
  }
}

/** Decimal coefficients such as 0.333 and 0.667 sum to a whole number only within rounding. */
const ROUNDED_SUM = 1e-12;

function signed(value: number): string {
  const rounded = Number(value.toPrecision(12));
  return rounded > 0 ? `+${rounded}` : `${rounded}`;
}
