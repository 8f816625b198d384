import { defineFunction } from '../entry.ts';
import { AMOUNTS, CONDITIONS, CONSTANT, EQUATION } from '../parameters/common.ts';
import { unitOfAll } from '../problem/basis.ts';
import { amountInLine, solved } from '../problem/solved.ts';
import { alignedWith } from '../reading/amounts.ts';
import { alignedShape } from '../reading/lines.ts';

export const compositionAtEquilibrium = defineFunction({
  name: 'COMPOSITION.AT.EQUILIBRIUM',
  summary: 'The amounts at equilibrium, each to full relative precision, a trace of 1e-30 too.',
  parameters: { equation: EQUATION, K: CONSTANT, amounts: AMOUNTS, conditions: CONDITIONS },
  gives: 'one cell for each line of the table, in the unit of the line',
  shape: ({ amounts }) => alignedShape(amounts!),
  examples: [
    {
      formula: '=COMPOSITION.AT.EQUILIBRIUM("A + B = 2 C", 4, {1; 1; 0})',
      gives: [[0.5], [0.5], [1]],
      within: 1e-14,
      source: 'by hand: (2 x 0.5)^2 / (0.5 x 0.5) is 4',
    },
    {
      cells: {
        A1: [
          ['species', 'SO2(g)', 'O2(g)', 'SO3(g)', 'N2(g)'],
          ['amount', 12, 9, 0, 79],
          ['unit', 'kmol', 'kmol', 'kmol', 'kmol'],
        ],
        G1: [
          ['pressure', 1, 'atm'],
          ['K in terms of', 'pressure', 'atm'],
        ],
      },
      formula: '=COMPOSITION.AT.EQUILIBRIUM("SO2(g) + 1/2 O2(g) = SO3(g)", 74, A1:E3, G1:I2)',
      gives: [['at equilibrium', 0.797787, 3.3988935, 11.202213, 79]],
      within: 1e-6,
      source: 'Ahuja, Chemical Engineering Thermodynamics, example 17.2, with nitrogen: SO3 is 11.202213',
    },
  ],
  run(given) {
    const { setup, outcome } = solved(given);
    const value = alignedWith(given.amounts.form, 'at equilibrium', (position) =>
      amountInLine(setup, outcome.amounts, position),
    );
    return { value, unit: unitOfAll(given.amounts.form), outcome };
  },
});
