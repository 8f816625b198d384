/** Constants of equilibrium carried, converted and restated, against published figures and exact values. */
import { describe, expect, it } from 'vitest';
import { formulaValue } from '../functions/formulaValue.ts';
import { testFigures } from './figures.ts';

describe('K.FROM.GIBBS', () => {
  // Both columns of the tables are rounded, by 0.0005 in log10 K and by 0.0005 kJ/mol (0.0001 in log10 K),
  // and the older of them were worked with a gas constant of 8.3143, 2 parts in 100 000 below today's: the
  // row of SO2 gives back 8.31416 to 8.31432.
  const ROUNDING = 0.0006;
  const GAS_CONSTANT_THEN = 2e-5;
  const rows: readonly (readonly [species: string, temperatureK: number, gibbs: number, log10K: number])[] = [
    ['NH3', 298.15, -16.367, 2.867],
    ['NH3', 400, -5.941, 0.776],
    ['NH3', 600, 15.879, -1.382],
    ['NH3', 1000, 61.91, -3.234],
    ['NH3', 2000, 179.447, -4.687],
    ['NO2', 298.15, 51.258, -8.98],
    ['NO2', 1000, 95.779, -5.003],
    ['N2O4', 298.15, 97.787, -17.132],
    ['N2O4', 500, 158.109, -16.518],
    ['SO2', 298.15, -300.125, 52.581],
    ['H2O', 1000, -192.59, 10.06],
    ['CO', 1000, -200.275, 10.461],
    ['CO', 1500, -243.74, 8.488],
    ['CO2', 1000, -395.886, 20.679],
    ['CO2', 1800, -396.353, 11.502],
    ['CH4', 1000, 19.492, -1.018],
    ['CH4', 1800, 108.445, -3.147],
  ];
  testFigures(
    rows.map(([species, temperatureK, gibbs, log10K]) => ({
      is: `log10 of the formation constant of ${species} at ${temperatureK} K`,
      source: 'NIST-JANAF tables, 4th edition (Chase 1998)',
      formula: `=LN(K.FROM.GIBBS(${gibbs}, ${temperatureK}))/LN(10)`,
      printed: log10K,
      within: ROUNDING + GAS_CONSTANT_THEN * Math.abs(log10K),
    })),
  );
});

describe('K.VANTHOFF', () => {
  testFigures([
    {
      is: 'constant of ammonia at 500 K from that at 298 K',
      source: 'Atkins, Physical Chemistry, on the van ’t Hoff equation (from memory)',
      formula: '=K.VANTHOFF(6.1E5, 298, -92.2, 500)',
      printed: 0.18,
      within: 0.005,
    },
  ]);

  it('is the integral of the van ’t Hoff equation where the heat capacity changes', () => {
    // Simpson's rule on 2000 steps, whose error is below 1e-12 for so smooth a curve.
    const R = 8.31446261815324;
    const slope = (T: number) => (-94_000 + 12 * (T - 700)) / (R * T * T);
    const steps = 2000;
    const h = (900 - 700) / steps;
    let sum = slope(700) + slope(900);
    for (let i = 1; i < steps; i++) sum += (i % 2 === 0 ? 2 : 4) * slope(700 + i * h);
    const found = formulaValue('=LN(K.VANTHOFF(250, 700, -94, 900, 12)/250)') as number;
    expect(Math.abs(found - (sum * h) / 3)).toBeLessThan(1e-12);
  });

  it('goes back the way that it came', () => {
    // Two exponentials of about 5, each rounded by some 5 parts in 1e16.
    const found = formulaValue('=K.VANTHOFF(K.VANTHOFF(3E-4, 300, 80, 400), 400, 80, 300)') as number;
    expect(Math.abs(found / 3e-4 - 1)).toBeLessThan(1e-14);
  });
});

describe('K.RESTATE', () => {
  const from = (K: number, equation: string, terms: string, wanted: string, celsius: number) =>
    `=K.RESTATE(${K}, "${equation}", "${terms}", "${wanted}", CONDITIONS.TABLE("temperature", ${celsius}, "degC"))`;
  testFigures([
    {
      is: 'K_p in atm of the methanol synthesis at 220 degC from K_c = 10.5',
      source: 'Chang, Chemistry, example 14.5 (from memory)',
      formula: from(10.5, 'CO(g) + 2 H2(g) = CH3OH(g)', 'concentration mol/L', 'pressure atm', 220),
      printed: 0.00641,
      within: 0.000005,
    },
    {
      is: 'K_c of the ammonia synthesis at 375 degC from K_p = 4.3e-4',
      source: 'Chang, Chemistry, practice exercise to example 14.5 (from memory)',
      formula: from(4.3e-4, 'N2(g) + 3 H2(g) = 2 NH3(g)', 'pressure atm', 'concentration mol/L', 375),
      printed: 1.2,
      within: 0.05,
    },
  ]);

  it('turns atm into bar by the exact 1.01325 to the power of the change in gas', () => {
    const formula = '=K.RESTATE(0.5, "N2(g) + 3 H2(g) = 2 NH3(g)", "pressure atm", "pressure bar")';
    const found = formulaValue(formula) as number;
    expect(Math.abs(found / (0.5 / (1.01325 * 1.01325)) - 1)).toBeLessThan(1e-15 * 4);
  });

  it('turns bar into mole fractions by the pressure to the power of the change in gas', () => {
    const formula =
      '=K.RESTATE(8, "A(g) = 2 B(g)", "activity", "mole fraction", CONDITIONS.TABLE("pressure", 4, "bar"))';
    expect(Math.abs((formulaValue(formula) as number) - 2)).toBeLessThan(1e-15 * 4);
  });
});
