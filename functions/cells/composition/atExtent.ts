import { amountsAtExtent, extentLimits } from '../../equilibrium/limits.ts';
import { inputError } from '../../errors.ts';
import { defineFunction } from '../entry.ts';
import { AMOUNTS, EQUATION } from '../parameters/common.ts';
import { number } from '../parameters/number.ts';
import { unitOfAll } from '../problem/basis.ts';
import { feedOf } from '../problem/feed.ts';
import { amountInLine } from '../problem/solved.ts';
import { alignedWith } from '../reading/amounts.ts';
import { alignedShape } from '../reading/lines.ts';

export const compositionAtExtent = defineFunction({
  name: 'COMPOSITION.AT.EXTENT',
  summary: 'The amounts when the reaction has run to a given extent: n = n0 + nu xi.',
  parameters: {
    equation: EQUATION,
    amounts: AMOUNTS,
    extent: number('Extent, in the unit of the amounts (as EXTENT.SOLVE gives it).'),
  },
  gives: 'one cell for each line of the table, in the unit of the line',
  shape: ({ amounts }) => alignedShape(amounts!),
  examples: [
    {
      formula: '=COMPOSITION.AT.EXTENT("A + 2 B = C", {1; 3; 0.5}, 0.5)',
      gives: [[0.5], [2], [1]],
      source: 'by hand',
    },
    {
      formula: '=COMPOSITION.AT.EXTENT("A + 2 B = C", {1; 3; 0.5}, 1.25)',
      gives: { error: 'extent-infeasible' },
      source: 'by hand: A is used up at 1',
    },
  ],
  run({ equation, amounts, extent }) {
    const { matched, feed } = feedOf(equation, amounts);
    const [lowest, highest] = extentLimits(equation.stoichiometry, feed);
    if (extent < lowest || extent > highest)
      throw inputError('extent-infeasible', { extent, lowest, highest });
    const found = amountsAtExtent(equation.stoichiometry, feed, extent);
    const value = alignedWith(amounts.form, 'at this extent', (position) =>
      amountInLine({ matched, table: amounts }, found, position),
    );
    return { value, unit: unitOfAll(amounts.form) };
  },
});
