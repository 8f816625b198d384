import { defineFunction } from '../entry.ts';
import { AMOUNTS, CONDITIONS, CONSTANT, EQUATION } from '../parameters/common.ts';
import { solved } from '../problem/solved.ts';

export const extentSolve = defineFunction({
  name: 'EXTENT.SOLVE',
  summary:
    'The extent at which the reaction is at equilibrium, the only feasible one; or where a phase runs out before.',
  parameters: { equation: EQUATION, K: CONSTANT, amounts: AMOUNTS, conditions: CONDITIONS },
  gives: 'the extent in the unit of the amounts, positive where the reaction ran forward',
  sources: ['IUPAC Green Book, 3rd edition, section 2.10: extent of reaction (from memory)'],
  examples: [
    {
      formula: '=EXTENT.SOLVE("A + B = 2 C", 4, {1; 1; 0})',
      gives: 0.5,
      within: 1e-14,
      source: 'by hand: (2 x 0.5)^2 / (0.5 x 0.5) is 4',
    },
    {
      formula: '=EXTENT.SOLVE("H2(g) + I2(g) = 2 HI(g)", 54.3, {0.5; 0.5; 0})',
      gives: 0.393,
      within: 1e-3,
      source: 'Chang, Chemistry, example 14.9: 0.107 of each element is left of 0.5',
    },
    {
      cells: {
        A1: [
          ['species', 'amount', 'unit'],
          ['N2(g)', 1, 'mol'],
          ['H2(g)', 3, 'mol'],
          ['NH3(g)', 0, 'mol'],
        ],
        E1: [['pressure', 1, 'bar']],
      },
      formula: '=EXTENT.SOLVE("1/2 N2(g) + 3/2 H2(g) = NH3(g)", 778, A1:C4, E1:G1)',
      gives: 1.93712,
      within: 1e-6,
      source:
        'de Nevers, Physical and Chemical Equilibrium, example 12.9: fraction of ammonia y = 0.939036, extent 4 y/(1 + y)',
    },
  ],
  run(given) {
    const { outcome, setup } = solved(given);
    return { value: outcome.extent, unit: setup.matched.unitText, outcome };
  },
});
