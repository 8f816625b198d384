import { direction } from '../../equilibrium/quotient.ts';
import { inputError } from '../../errors.ts';
import { defineFunction } from '../entry.ts';
import { AMOUNTS, CONDITIONS, CONSTANT, EQUATION } from '../parameters/common.ts';
import { affinityUncertainty, mixtureSetup, reducedAffinity } from '../problem/affinity.ts';
import { statedLnK } from '../problem/constant.ts';

/** Half-width of a 95 % interval in standard uncertainties (JCGM 100:2008, table G.1, normal distribution). */
const COVERAGE_95 = 1.96;

export const reactionDirection = defineFunction({
  name: 'REACTION.DIRECTION',
  summary: 'Which way the reaction runs from the amounts as they stand, by comparing Q with K.',
  parameters: { equation: EQUATION, K: CONSTANT, amounts: AMOUNTS, conditions: CONDITIONS },
  gives:
    'forward, reverse, at equilibrium (ln Q equals ln K within its rounding), undecided (the given standard uncertainties leave both directions inside 95 %), or exhausted (the phase that would have to be used up is absent)',
  examples: [
    {
      formula: '=REACTION.DIRECTION("H2(g) + I2(g) = 2 HI(g)", 54.3, {0.00623; 0.00414; 0.0224})',
      gives: 'forward',
      source: 'Chang, Chemistry, example 14.10: Q is 19.5, below K',
    },
    {
      formula: '=REACTION.DIRECTION("A + B = 2 C", 4, {1; 1; 2})',
      gives: 'at equilibrium',
      source: 'by hand: Q is 4',
    },
  ],
  run({ equation, K, amounts, conditions }) {
    const setup = mixtureSetup(equation, statedLnK(K, conditions), amounts, conditions);
    const found = direction(setup.problem);
    if (found === 'blocked') throw inputError('reaction-blocked', { equation: equation.text });
    const isAffinityFinite = setup.problem.feed.every((n, i) => n > 0 || !setup.problem.mixed[i]);
    if (isAffinityFinite) {
      const u = affinityUncertainty(setup);
      if (u !== null && u > 0 && Math.abs(reducedAffinity(setup)) < COVERAGE_95 * u)
        return { value: 'undecided' };
    }
    return { value: found };
  },
});
