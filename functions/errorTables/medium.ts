/** Errors of the medium of a reaction, and of what it needs. */
import type { ErrorTemplate } from '../errorTable.ts';

export const MEDIUM_ERRORS = {
  'medium-two-rows': {
    says: 'the gas of {equation} has both a pressure row and a volume row',
    remedy: 'Keep the one that stays constant while the reaction runs.',
  },
  'medium-as-given': {
    says: 'the medium is as given, so that the {row} row has no meaning',
    remedy: 'Take out the {row} row, or state medium | gas.',
  },
  'medium-phase': {
    says: '{species} is neither mixed in the medium {medium} nor a pure phase beside it',
    remedy: 'Change the medium row or the phase tag; medium | as given takes activities of several phases.',
  },
  'medium-tags-forgotten': {
    says: 'the conditions give a {row}, but in {equation} nothing is tagged as a gas and no medium is stated',
    remedy: 'Tag the gases with (g), or add a row medium | gas, solution or ideal liquid.',
  },
  'medium-missing': {
    says: 'the amount of gas changes by {change} in {equation}, so that the answer depends on the pressure or the volume',
    remedy:
      'Add a pressure row or a volume row, or medium | as given where the amounts are activities already.',
  },
  'medium-liquids': {
    says: '{equation} has several liquids, which may be mixed or apart',
    remedy: 'Add the row medium | ideal liquid where they are one solution.',
  },
  'medium-untagged': {
    says: '{species} has no phase tag in {equation}, where others are gases',
    remedy: 'Tag it with (g), (l) or (s), or add the row medium | gas.',
  },
  'medium-unknown': {
    says: 'nothing says in which medium the constant of {equation} is stated',
    remedy: 'Tag the species with (g) or (aq), or add a medium row.',
  },
  'condition-missing': {
    says: 'the conditions have no {name} row, which is needed for {purpose}',
    remedy: 'Add the row {name} with its unit.',
  },
  'condition-range': {
    says: 'the {name} comes to {value}, but it must be greater than 0 and at most 1e15',
    remedy: 'Correct the {name} row.',
  },
  'barometer-range': {
    says: 'the barometer reads {value} bar, which it does nowhere on earth',
    remedy: 'Check its unit; most barometers read in mbar or hPa.',
  },
  'condition-inert': {
    says: 'the conditions hold {name} out of reaction, but it is no line of the amounts beside {equation}',
    remedy: 'Name a species that is fed and is not in the equation.',
  },
  'temperature-range': {
    says: '{argument} is {value}, which is not above absolute zero',
    remedy: 'Give a temperature above 0 K, or its unit.',
  },
} as const satisfies Record<string, ErrorTemplate>;
