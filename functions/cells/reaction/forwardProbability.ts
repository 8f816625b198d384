import { inputError } from '../../errors.ts';
import { normalProbability } from '../problem/normalProbability.ts';
import { defineFunction } from '../entry.ts';
import { AMOUNTS, CONSTANT, EQUATION, NEEDED_CONDITIONS } from '../parameters/common.ts';
import { affinityUncertainty, mixtureSetup, reducedAffinity } from '../problem/affinity.ts';
import { statedLnK } from '../problem/constant.ts';

export const reactionForwardProbability = defineFunction({
  name: 'REACTION.FORWARD.PROBABILITY',
  summary:
    'The probability that the reaction runs forward, from the standard uncertainties of K, the amounts and the conditions, with ln(K/Q) taken as normally distributed.',
  parameters: { equation: EQUATION, K: CONSTANT, amounts: AMOUNTS, conditions: NEEDED_CONDITIONS },
  gives: 'a probability between 0 and 1',
  sources: ['JCGM 100:2008, equation (10), uncertainties taken as uncorrelated'],
  examples: [
    {
      cells: { A1: [['K uncertainty', Math.LN2]] },
      formula: '=REACTION.FORWARD.PROBABILITY("A + B = 2 C", 8, {1; 1; 2}, A1:B1)',
      gives: 0.8413447,
      within: 1e-6,
      source:
        'normal distribution at one standard deviation: Abramowitz and Stegun, table 26.1 (from memory)',
    },
  ],
  run({ equation, K, amounts, conditions }) {
    const setup = mixtureSetup(equation, statedLnK(K, conditions), amounts, conditions);
    const u = affinityUncertainty(setup);
    if (u === null || u === 0) throw inputError('uncertainty-missing', {});
    return { value: normalProbability(reducedAffinity(setup) / u) };
  },
});
