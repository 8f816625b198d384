import { reactionQuotient } from '../../equilibrium/quotient.ts';
import { inputError } from '../../errors.ts';
import { defineFunction } from '../entry.ts';
import { AMOUNTS, CONDITIONS, EQUATION } from '../parameters/common.ts';
import { mixtureSetup } from '../problem/affinity.ts';
import { isHoldable } from '../problem/holdable.ts';

export const reactionQuotientOf = defineFunction({
  name: 'REACTION.QUOTIENT',
  summary:
    'The reaction quotient Q: the product of the activities, each to the power of its stoichiometric number, in the terms in which K is stated.',
  parameters: { equation: EQUATION, amounts: AMOUNTS, conditions: CONDITIONS },
  gives: 'Q; 0 where only products are absent',
  sources: ['IUPAC Green Book, 3rd edition, section 2.11 (from memory)'],
  examples: [
    {
      formula: '=REACTION.QUOTIENT("H2(g) + I2(g) = 2 HI(g)", {0.00623; 0.00414; 0.0224})',
      gives: 19.453,
      within: 1e-4,
      source: 'Chang, Chemistry, example 14.10: the amounts as given; 0.0224 squared over 0.00623 x 0.00414',
    },
    {
      cells: {
        A1: [
          ['N2(g)', 1, 'mol'],
          ['H2(g)', 2, 'mol'],
          ['NH3(g)', 1, 'mol'],
        ],
        E1: [['pressure', 2, 'bar']],
      },
      formula: '=REACTION.QUOTIENT("N2(g) + 3 H2(g) = 2 NH3(g)", A1:C3, E1:G1)',
      gives: 0.5,
      within: 1e-14,
      source: 'by hand: fractions 1/4, 1/2, 1/4, so (1/4)^2 / (1/4 x 1/8) / 2^2',
    },
  ],
  run({ equation, amounts, conditions }) {
    const { problem, lnBasisShift } = mixtureSetup(equation, 0, amounts, conditions);
    const { lnQ, absentReactants, absentProducts } = reactionQuotient(problem);
    if (lnQ !== null) {
      const lnStated = lnQ - lnBasisShift;
      if (isHoldable(lnStated)) return { value: Math.exp(lnStated) };
      throw inputError('quotient-too-large', { lnQ: lnStated.toPrecision(6) });
    }
    if (absentReactants.length === 0) return { value: 0 };
    throw inputError('quotient-undefined', {
      absent: absentReactants.map((i) => problem.species[i]).join(', '),
      which: absentProducts.length === 0 ? 'reactant' : 'reactant and a product',
    });
  },
});
