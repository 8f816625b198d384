import { GAS_CONSTANT, JOULE_PER_KILOJOULE } from '../../data/constants.ts';
import { inputError } from '../../errors.ts';
import { defineFunction } from '../entry.ts';
import { TEMPERATURE_UNIT } from '../parameters/common.ts';
import { number, positiveNumber } from '../parameters/number.ts';
import { optional } from '../parameters/optional.ts';
import { isHoldable } from '../problem/holdable.ts';
import { kelvin } from '../problem/kelvin.ts';

export const kVantHoff = defineFunction({
  name: 'K.VANTHOFF',
  summary:
    'Carries a constant from one temperature to another: d ln K/dT = enthalpy/(RT^2), the enthalpy constant or changing with a constant heat capacity change.',
  parameters: {
    K: positiveNumber('Constant at the first temperature.'),
    T1: number('First temperature.'),
    'reaction enthalpy': number('Reaction enthalpy at the first temperature, kJ/mol.'),
    T2: number('Second temperature.'),
    'heat capacity change': optional(
      number('Heat capacity change of the reaction, J/(mol K); 0 where left out.'),
    ),
    unit: TEMPERATURE_UNIT,
  },
  gives: 'K at the second temperature, in the terms of the first',
  sources: [
    'Smith, Van Ness and Abbott, Introduction to Chemical Engineering Thermodynamics, section 13.4 (from memory)',
  ],
  examples: [
    {
      formula: '=K.VANTHOFF(1.8E-5, 298.15, 0, 350)',
      gives: 1.8e-5,
      within: 1e-14,
      source: 'by hand: without a reaction enthalpy K does not change',
    },
    {
      formula: '=K.VANTHOFF(1, 300, 8.31446261815324, 600)',
      gives: 5.29449,
      within: 1e-7,
      source: 'by hand: exp(1000 (1/300 - 1/600)) = exp(5/3)',
    },
  ],
  run({ K, T1, 'reaction enthalpy': enthalpy, T2, 'heat capacity change': heatCapacity = 0, unit }) {
    const first = kelvin(T1, unit, 'T1');
    const second = kelvin(T2, unit, 'T2');
    const byEnthalpy =
      ((enthalpy * JOULE_PER_KILOJOULE) / GAS_CONSTANT) * ((second - first) / (first * second));
    const byHeatCapacity = (heatCapacity / GAS_CONSTANT) * (first / second - 1 - Math.log(first / second));
    const change = byEnthalpy + byHeatCapacity;
    const lnK = Math.log(K) + change;
    if (!isHoldable(change) || !isHoldable(lnK))
      throw inputError('constant-too-large', { lnK: lnK.toPrecision(6) });
    return { value: K * Math.exp(change) };
  },
});
