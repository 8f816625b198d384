import { defineFunction } from '../entry.ts';
import { AMOUNTS, CONDITIONS, CONSTANT, EQUATION } from '../parameters/common.ts';
import { mixtureSetup, reducedAffinity } from '../problem/affinity.ts';
import { statedLnK } from '../problem/constant.ts';

export const reactionReducedAffinity = defineFunction({
  name: 'REACTION.REDUCED.AFFINITY',
  summary: 'How far the mixture is from equilibrium: ln(K/Q), positive where the reaction runs forward.',
  parameters: { equation: EQUATION, K: CONSTANT, amounts: AMOUNTS, conditions: CONDITIONS },
  gives: 'ln(K/Q), a pure number',
  examples: [
    {
      formula: '=REACTION.REDUCED.AFFINITY("A + B = 2 C", 8, {1; 1; 2})',
      gives: Math.LN2,
      within: 1e-14,
      source: 'by hand: K is 8 and Q is 4',
    },
  ],
  run({ equation, K, amounts, conditions }) {
    const setup = mixtureSetup(equation, statedLnK(K, conditions), amounts, conditions);
    return { value: reducedAffinity(setup) };
  },
});
