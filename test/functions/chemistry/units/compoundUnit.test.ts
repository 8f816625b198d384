import { expect, test } from 'vitest';
import { COMPOUND_PARTS, compoundUnit } from '../../../../functions/chemistry/units/compoundUnit.ts';

const POUND = 0.45359237;
const FOOT = 0.3048;

/** Each part that may stand in a compound, in coherent SI units (SI Brochure, NIST SP 811; from memory). */
const SIZES: Record<string, number> = {
  ...{ mol: 1, kmol: 1e3, mmol: 1e-3, umol: 1e-6, nmol: 1e-9, lbmol: POUND * 1000 },
  ...{ g: 1e-3, kg: 1, mg: 1e-6, ug: 1e-9, t: 1e3, lb: POUND },
  ...{ L: 1e-3, mL: 1e-6, m3: 1, dm3: 1e-3, cm3: 1e-6 },
  ...{ m: 1, dm: 0.1, cm: 0.01, mm: 1e-3, km: 1e3, ft: FOOT, in: 0.0254 },
  ...{ s: 1, ms: 1e-3, min: 60, h: 3600, d: 86400, K: 1 },
  ...{ J: 1, kJ: 1e3, MJ: 1e6, GJ: 1e9, cal: 4.184, kcal: 4184, W: 1, kW: 1e3, MW: 1e6, N: 1, kN: 1e3 },
  ...{ Pa: 1, hPa: 100, kPa: 1e3, MPa: 1e6, bar: 1e5, mbar: 100, atm: 101325 },
};

test.each([...COMPOUND_PARTS])('%s counts in a compound as its definition says', (part) => {
  // the sixth power is no quantity of its own, so that its numerator is in coherent SI units
  const sixth = compoundUnit(`${part}^6`)!;
  const expected = SIZES[part]! ** 6;
  expect(sixth.quantity).toBe('other');
  // six factors and five products, each rounded by half a unit in the last place, on both sides
  expect(Math.abs(sixth.numerator / expected - 1)).toBeLessThanOrEqual(12 * Number.EPSILON);
});

test.each([
  ['lb/ft^3', 'mass concentration', (POUND * 1000) / (FOOT * 10) ** 3],
  ['g m/(s^2 m^2)', 'pressure', 1e-3 / 1e5],
  ['kcal/kmol', 'molar energy', 4.184e-3],
  ['MJ/(kmol K)', 'molar entropy', 1e3],
  ['J/mol / K', null, 0],
  ['bar L/(mol K)', 'molar entropy', 100],
  ['lbmol/ft^3', 'concentration', POUND / FOOT ** 3],
  ['kW h', 'energy', 3600],
  ['mol m^-3', 'concentration', 1e-3],
  ['umol/g', 'molality', 1e-3],
])('%s is a %s', (text, quantity, factor) => {
  const unit = compoundUnit(text);
  if (quantity === null) {
    expect(unit).toBeNull();
    return;
  }
  expect(unit!.quantity).toBe(quantity);
  expect(Math.abs(unit!.factor / factor - 1)).toBeLessThan(8 * Number.EPSILON);
});

test.each(['kJ/(kg K)', 'W/(m^2 K)', 'Pa s', 'g/mol', 'bar/min', 'kg'])('%s is read', (text) => {
  expect(compoundUnit(text)).not.toBeNull();
});

test.each([
  'J/mol K',
  'J/(mol K) s',
  'psi L',
  'torr L',
  'mmHg/s',
  'kg/kg',
  'm/m',
  'm^7',
  'm^12',
  'm^1.5',
  '2 m',
  'm 2',
  'degC/s',
  'J/(mol',
  'm*',
  '/',
  '',
  'C',
  `${'GJ^6 '.repeat(11)}GJ`,
])('"%s" is not', (text) => {
  expect(compoundUnit(text)).toBeNull();
});
