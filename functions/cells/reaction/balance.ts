import { balanceEquation } from '../../chemistry/balance.ts';
import { defineFunction } from '../entry.ts';
import { text } from '../parameters/text.ts';

export const reactionBalance = defineFunction({
  name: 'REACTION.BALANCE',
  summary: 'Balances an equation with the smallest whole coefficients.',
  parameters: { equation: text('Reaction equation; coefficients that it has already are not used.') },
  gives: 'the balanced equation as a text, or an error when there is none or more than one independent',
  examples: [
    {
      formula: '=REACTION.BALANCE("C3H8 + O2 = CO2 + H2O")',
      gives: 'C3H8 + 5 O2 = 3 CO2 + 4 H2O',
      source: 'by hand',
    },
    {
      formula: '=REACTION.BALANCE("CO + CO2 + H2 = CH3OH + H2O")',
      gives: { error: 'balance-not-unique' },
      source: 'by hand: two independent reactions',
    },
  ],
  run: ({ equation }) => ({ value: balanceEquation(equation) }),
});
