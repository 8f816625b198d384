/**
 * The quantities that a conditions table may name, and what each row of it must hold.
 */
import type { Quantity } from '../../chemistry/units/unit.ts';

/** A measured condition: a number with a unit of one of these quantities. */
interface Measured {
  readonly holds: 'number';
  readonly quantities: readonly Quantity[];
  readonly unitExample: string;
}
/** A choice among words; `unit` says of which quantities a unit may stand beside it. */
interface Chosen {
  readonly holds: 'word';
  readonly words: readonly string[];
  readonly quantities?: readonly Quantity[];
}
/** The name of a species. */
interface Named {
  readonly holds: 'species';
}
/** A pure number, without a unit. */
interface Pure {
  readonly holds: 'pure number';
}
export type ConditionRule = Measured | Chosen | Named | Pure;

export const CONDITION_RULES = {
  temperature: { holds: 'number', quantities: ['temperature'], unitExample: 'K or degC' },
  pressure: { holds: 'number', quantities: ['pressure', 'gauge pressure'], unitExample: 'bar or kPa' },
  barometer: { holds: 'number', quantities: ['pressure'], unitExample: 'mbar' },
  volume: { holds: 'number', quantities: ['volume'], unitExample: 'L or m3' },
  medium: { holds: 'word', words: ['as given', 'gas', 'solution', 'ideal liquid'] },
  'K in terms of': {
    holds: 'word',
    words: ['activity', 'pressure', 'concentration', 'mole fraction'],
    quantities: ['pressure', 'concentration'],
  },
  'K written as': { holds: 'word', words: ['K', 'ln K', 'log10 K'] },
  'K uncertainty': { holds: 'pure number' },
  removal: { holds: 'word', words: ['allowed'] },
  inert: { holds: 'species' },
  'activity model': { holds: 'word', words: ['ideal'] },
  'gas model': { holds: 'word', words: ['ideal'] },
} as const satisfies Record<string, ConditionRule>;

export type ConditionName = keyof typeof CONDITION_RULES;

export const CONDITION_NAMES = Object.keys(CONDITION_RULES) as readonly ConditionName[];

const BY_LOWER_CASE = new Map(CONDITION_NAMES.map((name) => [name.toLowerCase(), name]));

/** The condition of this name, whatever its case and the white space around it. */
export function conditionName(text: string): ConditionName | undefined {
  return BY_LOWER_CASE.get(text.trim().toLowerCase());
}
