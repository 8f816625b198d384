import { GAS_CONSTANT, JOULE_PER_KILOJOULE } from '../../data/constants.ts';
import { inputError } from '../../errors.ts';
import { defineFunction } from '../entry.ts';
import { TEMPERATURE_UNIT } from '../parameters/common.ts';
import { number } from '../parameters/number.ts';
import { isHoldable } from '../problem/holdable.ts';
import { kelvin } from '../problem/kelvin.ts';

export const kFromGibbs = defineFunction({
  name: 'K.FROM.GIBBS',
  summary: 'The constant that belongs to a standard reaction Gibbs energy: ln K = -G/(RT).',
  parameters: {
    'reaction Gibbs energy': number('Standard reaction Gibbs energy at the temperature, kJ/mol.'),
    temperature: number('Temperature.'),
    unit: TEMPERATURE_UNIT,
  },
  gives: 'K in terms of activities at the standard state of the Gibbs energy',
  sources: ['IUPAC Green Book, 3rd edition, section 2.11 (from memory)'],
  examples: [
    {
      formula: '=K.FROM.GIBBS(-32.9, 25, "degC")',
      gives: 5.805e5,
      within: 1e-3,
      source: 'by hand: exp(32900/(8.31446 x 298.15)); for N2 + 3 H2 = 2 NH3',
    },
  ],
  run({ 'reaction Gibbs energy': gibbs, temperature, unit }) {
    const T = kelvin(temperature, unit, 'temperature');
    const lnK = (-gibbs * JOULE_PER_KILOJOULE) / (GAS_CONSTANT * T);
    if (!isHoldable(lnK)) throw inputError('constant-too-large', { lnK: lnK.toPrecision(6) });
    return { value: Math.exp(lnK) };
  },
});
