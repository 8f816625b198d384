import { extentLimits } from '../../equilibrium/limits.ts';
import { defineFunction } from '../entry.ts';
import { AMOUNTS, EQUATION } from '../parameters/common.ts';
import { feedOf } from '../problem/feed.ts';

export const extentLimitsOf = defineFunction({
  name: 'EXTENT.LIMITS',
  summary: 'The smallest and the largest extent at which no amount is negative.',
  parameters: { equation: EQUATION, amounts: AMOUNTS },
  gives: 'two cells side by side, in the unit of the amounts',
  shape: () => ({ rows: 1, columns: 2 }),
  examples: [
    {
      formula: '=EXTENT.LIMITS("A + 2 B = C", {1; 3; 0.5})',
      gives: [[-0.5, 1]],
      source: 'by hand: C is used up at -0.5, A at 1 (B only at 1.5)',
    },
  ],
  run({ equation, amounts }) {
    const { feed, matched } = feedOf(equation, amounts);
    const [lowest, highest] = extentLimits(equation.stoichiometry, feed);
    return { value: [[lowest, highest]], unit: matched.unitText };
  },
});
