import { matchSpecies } from '../../chemistry/match.ts';
import { firstToRunOut } from '../../equilibrium/limits.ts';
import { inputError } from '../../errors.ts';
import { defineFunction } from '../entry.ts';
import { AMOUNTS, CONDITIONS, CONSTANT, EQUATION } from '../parameters/common.ts';
import { optional } from '../parameters/optional.ts';
import { text } from '../parameters/text.ts';
import type { ExtentSetup } from '../problem/extentSetup.ts';
import { solved } from '../problem/solved.ts';

export const conversionAtEquilibrium = defineFunction({
  name: 'CONVERSION.AT.EQUILIBRIUM',
  summary: 'The fraction of a reactant that is converted at equilibrium: (n0 - n)/n0.',
  parameters: {
    equation: EQUATION,
    K: CONSTANT,
    amounts: AMOUNTS,
    conditions: CONDITIONS,
    species: optional(text('Reactant; left out, the one that would run out first.')),
  },
  gives: 'a fraction, negative where the reaction ran in reverse',
  examples: [
    {
      cells: { A1: [['medium', 'as given']] },
      formula:
        '=CONVERSION.AT.EQUILIBRIUM("CO(g) + H2O(g) = CO2(g) + H2(g)", 1, {1; 2; 0; 0}, A1:B1, "H2O(g)")',
      gives: 0.3333333,
      within: 1e-6,
      source: 'Smith, Van Ness and Abbott, example 13.5: fraction of steam reacted 0.333',
    },
  ],
  run({ species, ...given }) {
    const result = solved(given);
    const index = species === undefined ? firstReactant(result.setup) : namedReactant(result.setup, species);
    const { outcome } = result;
    const { problem } = result.setup;
    const converted = -problem.stoichiometry[index]! * outcome.extent;
    return { value: converted / problem.feed[index]!, outcome };
  },
});

/** The reactant with the least amount for its stoichiometric number. */
function firstReactant({ problem: { stoichiometry, feed }, reaction }: ExtentSetup): number {
  const first = firstToRunOut(stoichiometry, feed, 'reactants');
  if (!(feed[first]! > 0))
    throw inputError('conversion-nothing-fed', { species: reaction.species[first]!.text });
  return first;
}

function namedReactant({ problem, reaction }: ExtentSetup, label: string): number {
  const index = matchSpecies(reaction, label);
  if (index === null || index >= reaction.reactantCount) {
    throw inputError('conversion-species', { species: label, equation: reaction.text });
  }
  if (!(problem.feed[index]! > 0)) throw inputError('conversion-nothing-fed', { species: label });
  return index;
}
