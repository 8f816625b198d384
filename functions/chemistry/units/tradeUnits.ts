import { makeUnit, type Quantity, type Unit } from './unit.ts';

/** Spellings, the first of them canonical; then numerator, denominator, zero of the unit. */
type Row = readonly [spellings: string, numerator: number, denominator?: number, zero?: number];

/**
 * The units of the trade by exact definition, as ratios of whole numbers to the base units of
 * `Quantity`.
 *
 * Sources, all from memory: SI Brochure, 9th edition (litre, tonne, bar, prefixes, degC); NIST SP 811
 * (2008), appendix B, with its exact factors in bold: pound 0.45359237 kg, foot 0.3048 m, inch
 * 0.0254 m, standard gravity 9.80665 m/s2, atmosphere 101325 Pa, torr one 760th of it, conventional
 * mercury 13595.1 kg/m3, US gallon 231 cubic inches, thermochemical calorie 4.184 J, and the
 * international-table Btu 1055.05585262 J, degF as 5/9 K from 459.67 below its zero.
 */
const ROWS: Partial<Record<Quantity, readonly Row[]>> = {
  none: [['1, -', 1]],
  amount: [
    ['mol', 1],
    ['kmol', 1000],
    ['mmol', 1, 1000],
    ['umol', 1, 1e6],
    ['nmol', 1, 1e9],
    ['lbmol, lb-mol', 45359237, 100000],
  ],
  mass: [
    ['g', 1],
    ['kg', 1000],
    ['t, tonne', 1e6],
    ['mg', 1, 1000],
    ['ug', 1, 1e6],
    ['lb', 45359237, 100000],
  ],
  concentration: [
    ['mol/L, M', 1],
    ['mmol/L, mM', 1, 1000],
    ['umol/L, uM', 1, 1e6],
    ['nmol/L, nM', 1, 1e9],
    ['kmol/m3', 1],
    ['mol/m3', 1, 1000],
    ['mol/dm3', 1],
  ],
  molality: [
    ['mol/kg', 1],
    ['mmol/kg', 1, 1000],
    ['umol/kg', 1, 1e6],
  ],
  'mass concentration': [
    ['g/L', 1],
    ['mg/L', 1, 1000],
    ['ug/L', 1, 1e6],
    ['ng/L', 1, 1e9],
    ['kg/m3', 1],
    ['g/m3', 1, 1000],
    ['mg/m3', 1, 1e6],
    ['g/mL', 1000],
    ['g/cm3', 1000],
    ['kg/L', 1000],
    ['mg/mL', 1],
  ],
  'charge concentration': [
    ['eq/L', 1],
    ['meq/L', 1, 1000],
    ['ueq/L', 1, 1e6],
    ['eq/m3', 1, 1000],
  ],
  fraction: [
    ['%', 1, 100],
    ['ppm', 1, 1e6],
    ['ppb', 1, 1e9],
  ],
  'amount fraction': [
    ['mol/mol', 1],
    ['mol %, mol%, mole %, mole%', 1, 100],
    ['mmol/mol', 1, 1000],
    ['umol/mol', 1, 1e6],
    ['mol ppm', 1, 1e6],
    ['mol ppb', 1, 1e9],
  ],
  'mass fraction': [
    ['kg/kg', 1],
    ['g/g', 1],
    ['mass %, mass%, wt %, wt%', 1, 100],
    ['g/kg', 1, 1000],
    ['mg/kg', 1, 1e6],
    ['ug/kg', 1, 1e9],
    ['mass ppm, ppmw', 1, 1e6],
    ['mass ppb, ppbw', 1, 1e9],
  ],
  'volume fraction': [
    ['m3/m3', 1],
    ['L/L', 1],
    ['vol %, vol%', 1, 100],
    ['mL/m3', 1, 1e6],
    ['vol ppm, ppmv', 1, 1e6],
    ['vol ppb, ppbv', 1, 1e9],
  ],
  pressure: [
    ['bar, bara, bar(a), bar absolute', 1],
    ['mbar, mbar absolute', 1, 1000],
    ['Pa', 1, 1e5],
    ['hPa', 1, 1000],
    ['kPa, kPaa, kPa(a), kPa absolute', 1, 100],
    ['MPa, MPa(a), MPa absolute', 10],
    ['atm', 101325, 100000],
    ['torr, Torr', 101325, 760e5],
    // 13595.1 kg/m3 x 9.80665 m/s2 x 1 mm = 133.322387415 Pa
    ['mmHg', 133322387415, 1e14],
    ['inHg', 3386388640341, 1e14],
    // 0.45359237 kg x 9.80665 m/s2 / (0.0254 m)^2
    ['psi, psia, psi absolute', 44482216152605, 64516e10],
    ['kgf/cm2', 980665, 1e6],
  ],
  'gauge pressure': [
    ['bar gauge, barg, bar(g)', 1],
    ['mbar gauge, mbarg, mbar(g)', 1, 1000],
    ['kPa gauge, kPag, kPa(g)', 1, 100],
    ['MPa gauge, MPag, MPa(g)', 10],
    ['psi gauge, psig', 44482216152605, 64516e10],
  ],
  temperature: [
    ['K', 1],
    ['degC', 1, 1, 273.15],
    ['degF', 5, 9, 459.67],
    ['degR', 5, 9],
  ],
  volume: [
    ['L', 1],
    ['mL', 1, 1000],
    ['uL', 1, 1e6],
    ['m3', 1000],
    ['dm3', 1],
    ['cm3', 1, 1000],
    ['ft3', 28316846592, 1e9],
    ['US gal', 3785411784, 1e9],
  ],
  time: [
    ['s', 1],
    ['min', 60],
    ['h, hr, hour', 3600],
    ['d, day', 86400],
  ],
  energy: [
    ['kJ', 1],
    ['J', 1, 1000],
    ['MJ', 1000],
    ['GJ', 1e6],
    ['kcal', 4184, 1000],
    ['cal', 4184, 1e6],
    ['kWh', 3600],
    ['Btu', 105505585262, 1e11],
  ],
  'molar energy': [
    ['kJ/mol', 1],
    ['J/mol', 1, 1000],
    ['MJ/kmol', 1],
    ['kJ/kmol', 1, 1000],
    ['kcal/mol', 4184, 1000],
    ['cal/mol', 4184, 1e6],
  ],
  'molar entropy': [
    ['J/(mol K), J/mol/K', 1],
    ['kJ/(mol K), kJ/mol/K', 1000],
    ['kJ/(kmol K), kJ/kmol/K', 1],
    ['cal/(mol K), cal/mol/K', 4184, 1000],
    ['kcal/(mol K), kcal/mol/K', 4184],
  ],
};

/** Each unit of the trade under each of its spellings. */
export const TRADE_UNITS: ReadonlyMap<string, Unit> = new Map(
  Object.entries(ROWS).flatMap(([quantity, rows]) =>
    rows.flatMap(([spellings, numerator, denominator = 1, zero = 0]) => {
      const all = spellings.split(', ');
      const text = all[0]!;
      const unit = makeUnit({ text, quantity: quantity as Quantity, numerator, denominator, zero });
      return all.map((spelling): [string, Unit] => [spelling, unit]);
    }),
  ),
);
