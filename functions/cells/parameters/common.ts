/**
 * The arguments that most functions of one reaction share.
 */
import { amounts } from '../reading/amounts.ts';
import { conditions } from '../reading/conditions.ts';
import { equation } from './equation.ts';
import { number } from './number.ts';
import { optional } from './optional.ts';
import { text } from './text.ts';

export const EQUATION = equation();
export const CONSTANT = number(
  'Equilibrium constant, a number greater than 0, or its logarithm where a conditions row `K written as` says so.',
);
export const AMOUNTS = amounts(
  'Amounts table: species, amount, unit, standard uncertainty (the last two optional), or bare numbers in the order of the equation.',
);
export const CONDITIONS = optional(
  conditions(
    'Conditions table: quantity, value, unit, standard uncertainty. Left out, amounts and K are taken as given.',
  ),
);
export const NEEDED_CONDITIONS = conditions('Conditions table: quantity, value, unit, standard uncertainty.');
export const TEMPERATURE_UNIT = optional(text('Unit of the temperature, K where left out.'));
