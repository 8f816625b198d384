import { GAS_CONSTANT, JOULE_PER_KILOJOULE } from '../../data/constants.ts';
import { defineFunction } from '../entry.ts';
import { AMOUNTS, CONSTANT, EQUATION, NEEDED_CONDITIONS } from '../parameters/common.ts';
import { mixtureSetup, reducedAffinity } from '../problem/affinity.ts';
import { statedLnK } from '../problem/constant.ts';
import { temperatureK } from '../problem/state.ts';

export const reactionAffinity = defineFunction({
  name: 'REACTION.AFFINITY',
  summary:
    'The affinity of the reaction for the amounts as they stand: A = RT ln(K/Q), the fall of Gibbs energy.',
  parameters: { equation: EQUATION, K: CONSTANT, amounts: AMOUNTS, conditions: NEEDED_CONDITIONS },
  gives: 'kJ/mol, positive where the reaction runs forward',
  sources: ['IUPAC Green Book, 3rd edition, section 2.11: affinity of reaction (from memory)'],
  examples: [
    {
      cells: { A1: [['temperature', 300, 'K']] },
      formula: '=REACTION.AFFINITY("A + B = 2 C", 8, {1; 1; 2}, A1:C1)',
      gives: 1.7289439,
      within: 1e-7,
      source: 'by hand: 8.31446261815324 J/(mol K) x 300 K x ln 2',
    },
  ],
  run({ equation, K, amounts, conditions }) {
    const setup = mixtureSetup(equation, statedLnK(K, conditions), amounts, conditions);
    const RT = GAS_CONSTANT * temperatureK(conditions, 'an affinity');
    return { value: (RT * reducedAffinity(setup)) / JOULE_PER_KILOJOULE, unit: 'kJ/mol' };
  },
});
