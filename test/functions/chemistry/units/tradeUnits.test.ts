/**
 * Every accepted unit against its exact definition in SI units.
 *
 * Sources: SI Brochure, 9th edition (2019); NIST SP 811 (2008), appendix B; IUPAC Green Book, 3rd
 * edition. All from memory, recomputed here from the defining constants.
 */
import { describe, expect, test } from 'vitest';
import { toBase } from '../../../../functions/chemistry/units/convert.ts';
import { TRADE_UNITS } from '../../../../functions/chemistry/units/tradeUnits.ts';
import type { Quantity } from '../../../../functions/chemistry/units/unit.ts';

/** The base unit of each quantity in SI units; fractions are pure numbers. */
const BASE_IN_SI: Partial<Record<Quantity, number>> = {
  mass: 1e-3, // g in kg
  concentration: 1000, // mol/L in mol/m3
  'charge concentration': 1000,
  pressure: 1e5, // bar in Pa
  'gauge pressure': 1e5,
  volume: 1e-3, // L in m3
  energy: 1000, // kJ in J
  'molar energy': 1000,
  // mol, mol/kg, g/L = kg/m3, K, s, J/(mol K) and fractions are 1
};

const POUND = 0.45359237; // kg, NIST SP 811: exact
const FOOT = 0.3048; // m, exact
const INCH = 0.0254; // m, exact
const GRAVITY = 9.80665; // m/s2, standard, exact
const PSI = (POUND * GRAVITY) / (INCH * INCH);
const MERCURY = 13595.1 * GRAVITY; // Pa per metre of conventional mercury, exact
const CALORIE = 4.184; // J, thermochemical, exact

/** One of each unit, as a difference, in SI units. */
const SIZES: Record<string, Record<string, number>> = {
  none: { '1': 1, '-': 1 },
  amount: {
    mol: 1,
    kmol: 1e3,
    mmol: 1e-3,
    umol: 1e-6,
    nmol: 1e-9,
    lbmol: POUND * 1000,
    'lb-mol': POUND * 1000,
  },
  mass: { g: 1e-3, kg: 1, t: 1e3, tonne: 1e3, mg: 1e-6, ug: 1e-9, lb: POUND },
  concentration: {
    ...{ 'mol/L': 1e3, M: 1e3, 'mmol/L': 1, mM: 1, 'umol/L': 1e-3, uM: 1e-3, 'nmol/L': 1e-6, nM: 1e-6 },
    ...{ 'kmol/m3': 1e3, 'mol/m3': 1, 'mol/dm3': 1e3 },
  },
  molality: { 'mol/kg': 1, 'mmol/kg': 1e-3, 'umol/kg': 1e-6 },
  'mass concentration': {
    ...{ 'g/L': 1, 'mg/L': 1e-3, 'ug/L': 1e-6, 'ng/L': 1e-9, 'kg/m3': 1, 'g/m3': 1e-3, 'mg/m3': 1e-6 },
    ...{ 'g/mL': 1e3, 'g/cm3': 1e3, 'kg/L': 1e3, 'mg/mL': 1 },
  },
  'charge concentration': { 'eq/L': 1e3, 'meq/L': 1, 'ueq/L': 1e-3, 'eq/m3': 1 },
  fraction: { '%': 1e-2, ppm: 1e-6, ppb: 1e-9 },
  'amount fraction': {
    ...{ 'mol/mol': 1, 'mol %': 1e-2, 'mol%': 1e-2, 'mole %': 1e-2, 'mole%': 1e-2, 'mmol/mol': 1e-3 },
    ...{ 'umol/mol': 1e-6, 'mol ppm': 1e-6, 'mol ppb': 1e-9 },
  },
  'mass fraction': {
    ...{ 'kg/kg': 1, 'g/g': 1, 'mass %': 1e-2, 'mass%': 1e-2, 'wt %': 1e-2, 'wt%': 1e-2, 'g/kg': 1e-3 },
    ...{ 'mg/kg': 1e-6, 'ug/kg': 1e-9, 'mass ppm': 1e-6, ppmw: 1e-6, 'mass ppb': 1e-9, ppbw: 1e-9 },
  },
  'volume fraction': {
    ...{ 'm3/m3': 1, 'L/L': 1, 'vol %': 1e-2, 'vol%': 1e-2, 'mL/m3': 1e-6 },
    ...{ 'vol ppm': 1e-6, ppmv: 1e-6, 'vol ppb': 1e-9, ppbv: 1e-9 },
  },
  pressure: {
    ...{ bar: 1e5, bara: 1e5, 'bar(a)': 1e5, 'bar absolute': 1e5, mbar: 100, 'mbar absolute': 100 },
    ...{ Pa: 1, hPa: 100, kPa: 1e3, kPaa: 1e3, 'kPa(a)': 1e3, 'kPa absolute': 1e3 },
    ...{ MPa: 1e6, 'MPa(a)': 1e6, 'MPa absolute': 1e6, atm: 101325, torr: 101325 / 760, Torr: 101325 / 760 },
    ...{ mmHg: MERCURY * 1e-3, inHg: MERCURY * INCH, psi: PSI, psia: PSI, 'psi absolute': PSI },
    ...{ 'kgf/cm2': GRAVITY / 1e-4 },
  },
  'gauge pressure': {
    ...{ 'bar gauge': 1e5, barg: 1e5, 'bar(g)': 1e5, 'mbar gauge': 100, mbarg: 100, 'mbar(g)': 100 },
    ...{ 'kPa gauge': 1e3, kPag: 1e3, 'kPa(g)': 1e3, 'MPa gauge': 1e6, MPag: 1e6, 'MPa(g)': 1e6 },
    ...{ 'psi gauge': PSI, psig: PSI },
  },
  temperature: { K: 1, degC: 1, degF: 5 / 9, degR: 5 / 9 },
  volume: {
    ...{ L: 1e-3, mL: 1e-6, uL: 1e-9, m3: 1, dm3: 1e-3, cm3: 1e-6, ft3: FOOT * FOOT * FOOT },
    ...{ 'US gal': 231 * INCH * INCH * INCH },
  },
  time: { s: 1, min: 60, h: 3600, hr: 3600, hour: 3600, d: 86400, day: 86400 },
  energy: {
    kJ: 1e3,
    J: 1,
    MJ: 1e6,
    GJ: 1e9,
    kcal: CALORIE * 1e3,
    cal: CALORIE,
    kWh: 3.6e6,
    Btu: 1055.05585262,
  },
  'molar energy': {
    ...{
      'kJ/mol': 1e3,
      'J/mol': 1,
      'MJ/kmol': 1e3,
      'kJ/kmol': 1,
      'kcal/mol': CALORIE * 1e3,
      'cal/mol': CALORIE,
    },
  },
  'molar entropy': {
    ...{ 'J/(mol K)': 1, 'J/mol/K': 1, 'kJ/(mol K)': 1e3, 'kJ/mol/K': 1e3, 'kJ/(kmol K)': 1, 'kJ/kmol/K': 1 },
    ...{
      'cal/(mol K)': CALORIE,
      'cal/mol/K': CALORIE,
      'kcal/(mol K)': CALORIE * 1e3,
      'kcal/mol/K': CALORIE * 1e3,
    },
  },
};

// the expected sizes above carry up to six roundings of half a unit in the last place each
const SIX_ROUNDINGS = 6 * Number.EPSILON;

describe.each(Object.entries(SIZES))('%s', (quantity, sizes) => {
  test.each(Object.entries(sizes))('%s has the size of its definition', (spelling, size) => {
    const unit = TRADE_UNITS.get(spelling)!;
    expect(unit.quantity).toBe(quantity);
    const expected = size / (BASE_IN_SI[unit.quantity] ?? 1);
    expect(Math.abs(unit.factor / expected - 1)).toBeLessThanOrEqual(SIX_ROUNDINGS);
  });
});

test('no unit is accepted that is not tested above', () => {
  const tested = Object.values(SIZES).flatMap((sizes) => Object.keys(sizes));
  expect([...TRADE_UNITS.keys()].sort()).toEqual(tested.sort());
});

test('ratios are of whole numbers without rounding, pounds and mercury included', () => {
  for (const { numerator, denominator } of TRADE_UNITS.values()) {
    expect(Number.isInteger(numerator) && Number.isInteger(denominator)).toBe(true);
  }
});

// ITS-90 and the definition of the Fahrenheit scale: freezing and boiling points by convention
test.each([
  ['degC', 0, 273.15],
  ['degC', -273.15, 0],
  ['degF', 32, 273.15],
  ['degF', 212, 373.15],
  ['degF', -459.67, 0],
  ['degR', 491.67, 273.15],
])('on the scale of %s, %d is %d K', (spelling, value, kelvin) => {
  expect(toBase(value, TRADE_UNITS.get(spelling)!)).toBeCloseTo(kelvin, 12);
});
