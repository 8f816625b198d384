import { expect, test } from 'vitest';
import { parseSpecies } from '../../../../functions/chemistry/species.ts';
import { molPerUnit } from '../../../../functions/chemistry/units/molPerUnit.ts';
import { readUnit } from '../../../../functions/chemistry/units/readUnit.ts';
import { messageOf } from '../../raises.ts';

const of = (unit: string, species: string) => molPerUnit(readUnit(unit), parseSpecies(species));

// by hand, with the abridged atomic weights
test.each([
  ['mol', 'ester', 1],
  ['kmol/h', 'NH3', 1000 / 3600],
  ['mmol/L', 'Ca^2+', 0.001],
  ['mol/kg', 'Na+', 1],
  ['kPa', 'CO2(g)', 0.01],
  ['%', 'N2', 0.01],
  ['mol ppm', 'N2', 1e-6],
  ['vol %', 'CH4(g)', 0.01],
  ['kg', 'H2O', 1000 / 18.015],
  ['t/d', 'NH3', 1e6 / 86400 / 17.031],
  ['mg/L', 'Ca^2+', 0.001 / 40.078],
  ['meq/L', 'Ca^2+', 0.0005],
  ['meq/L', 'HCO3-', 0.001],
  ['meq/L', 'A^3-', 0.001 / 3],
])('1 %s of %s is %d in the molar base unit', (unit, species, mol) => {
  expect(Math.abs(of(unit, species) / mol - 1)).toBeLessThanOrEqual(3 * Number.EPSILON);
});

// 100 mg/L as CaCO3 is 1.998 meq/L: 40.04 mg/L of Ca, 121.9 mg/L of HCO3 (common practice; the
// customary factors 0.4004 and 1.219 are printed in water-treatment handbooks, from memory)
test.each([
  ['Ca^2+', 0.4004, 40.078],
  ['HCO3-', 1.219, 61.016],
  ['Mg^2+', 0.2428, 24.305],
])('as CaCO3, %s has its customary factor', (species, factor, gramPerMol) => {
  const gramPerGram = (of('mg/L as CaCO3', species) * gramPerMol) / 0.001;
  // half a unit in the last printed digit, 4 digits
  expect(Math.abs(gramPerGram / factor - 1)).toBeLessThan(5e-4);
});

test.each([
  ['mg/L as N', 'NO3-', 0.001 / 14.007],
  ['mg/L as N', 'N2O', 0.001 / 14.007 / 2],
  ['mg/L as NO3', 'NO3-', 0.001 / 62.004],
  ['mg/L as SiO2', 'H4SiO4', 0.001 / 60.083],
  ['mg/L as P2O5', 'PO4^3-', (0.001 / 141.943) * 2],
  ['g as P', 'P4', 1 / 30.974 / 4],
])('%s counts the atoms of %s', (unit, species, mol) => {
  expect(Math.abs(of(unit, species) / mol - 1)).toBeLessThanOrEqual(4 * Number.EPSILON);
});

test.each([
  ['unit-not-molar', 'degC', 'H2O'],
  ['unit-not-molar', 'bar gauge', 'N2(g)'],
  ['unit-not-molar', 'mass %', 'H2O'],
  ['unit-not-molar', 'vol %', 'CH3OH(l)'],
  ['unit-not-molar', 'vol %', 'CH3OH'],
  ['unit-not-molar', 'mg/L as N', 'PO4^3-'],
  ['unit-not-molar', 'mg/L as N', 'nitrate'],
  ['unit-not-molar', 'g', 'e^-'],
  ['composition-missing', 'kg', 'ester'],
  ['weight-missing', 'kg', 'Tc'],
  ['charge-missing', 'meq/L', 'CO2(aq)'],
  ['charge-missing', 'mg/L as CaCO3', 'CO2(aq)'],
  ['charge-missing', 'meq/L', 'HA'],
])('%s: %s of %s', (code, unit, species) => {
  expect(messageOf(code, () => of(unit, species))).toContain(species);
});

test.each(['%  as N', 'mol as N', 'bar as CaCO3', 'mg/L as H2O2', 'mg/L as CaCO3·H2O', 'mg/L as NH4NO3S'])(
  '"%s" has no meaning',
  (unit) => {
    messageOf('unit-not-expressible', () => readUnit(unit));
  },
);

test('what a mass is expressed as must be a formula', () => {
  messageOf('composition-missing', () => readUnit('mg/L as nitrogen'));
  messageOf('element-unknown', () => readUnit('mg/L as Xy2'));
});
