import { inputError } from '../../errors.ts';
import { defineFunction } from '../entry.ts';
import { EQUATION } from '../parameters/common.ts';

export const reactionCheck = defineFunction({
  name: 'REACTION.CHECK',
  summary: 'Checks that an equation balances in every element and in charge.',
  parameters: { equation: EQUATION },
  gives: 'TRUE, or an error that names each element or charge that does not balance, and by how much',
  examples: [
    { formula: '=REACTION.CHECK("N2(g) + 3 H2(g) = 2 NH3(g)")', gives: true, source: 'by hand' },
    {
      formula: '=REACTION.CHECK("MnO4^- + 5 Fe^2+ + 8 H^+ = Mn^2+ + 5 Fe^3+ + 4 H2O")',
      gives: true,
      source: 'by hand',
    },
    {
      formula: '=REACTION.CHECK("N2 + H2 = NH3")',
      gives: { error: 'equation-unbalanced' },
      source: 'by hand',
    },
    {
      formula: '=REACTION.CHECK("acid + alcohol = ester + water")',
      gives: { error: 'equation-not-checked' },
      source: 'by hand: names without a formula',
    },
  ],
  run({ equation: { text, check, named } }) {
    if (check === 'balanced') return { value: true };
    throw inputError('equation-not-checked', { equation: text, named: named.join(', ') });
  },
});
