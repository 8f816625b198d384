/** Equations that every textbook balances; their coefficients are common practice. */
import { describe, expect, it } from 'vitest';
import { formulaValue } from '../functions/formulaValue.ts';

const equations: readonly (readonly [equation: string, coefficients: readonly number[]])[] = [
  ['MnO4^- + C2O4^2- + H^+ = Mn^2+ + CO2 + H2O', [2, 5, 16, 2, 10, 8]],
  ['Cr2O7^2- + Fe^2+ + H^+ = Cr^3+ + Fe^3+ + H2O', [1, 6, 14, 2, 6, 7]],
  ['MnO4^- + Fe^2+ + H^+ = Mn^2+ + Fe^3+ + H2O', [1, 5, 8, 1, 5, 4]],
  ['S2O3^2- + I2 = S4O6^2- + I^-', [2, 1, 1, 2]],
  ['Zn + NO3^- + OH^- + H2O = Zn(OH)4^2- + NH3', [4, 1, 7, 6, 4, 1]],
  ['K4Fe(CN)6 + H2SO4 + H2O = K2SO4 + FeSO4 + (NH4)2SO4 + CO', [1, 6, 6, 2, 1, 3, 6]],
  ['KMnO4 + HCl = KCl + MnCl2 + Cl2 + H2O', [2, 16, 2, 2, 5, 8]],
  ['Cu + HNO3 = Cu(NO3)2 + NO + H2O', [3, 8, 3, 2, 4]],
  ['Ca3(PO4)2 + SiO2 + C = CaSiO3 + P4 + CO', [2, 6, 10, 6, 1, 10]],
  ['FeS2 + O2 = Fe2O3 + SO2', [4, 11, 2, 8]],
  ['NH3 + O2 = NO + H2O', [4, 5, 4, 6]],
  ['C8H18 + O2 = CO2 + H2O', [2, 25, 16, 18]],
  ['Fe2O3 + CO = Fe + CO2', [1, 3, 2, 3]],
  ['Al + NaOH + H2O = NaAl(OH)4 + H2', [2, 2, 6, 2, 3]],
  ['Pb + PbO2 + H2SO4 = PbSO4 + H2O', [1, 1, 2, 2, 2]],
  ['CuSO4·5H2O(s) = CuSO4(s) + H2O(g)', [1, 1, 5]],
];

/** The coefficients of a balanced equation, 1 where none is written. */
function coefficientsOf(equation: string): number[] {
  return equation.split(/ \+ | = /).map((term) => Number(/^(\d+) /.exec(term)?.[1] ?? 1));
}

describe('REACTION.BALANCE', () => {
  it.each(equations)('balances %s', (equation, coefficients) => {
    const balanced = formulaValue(`=REACTION.BALANCE("${equation}")`);
    expect(balanced).toBeTypeOf('string');
    expect(coefficientsOf(balanced as string)).toEqual(coefficients);
    expect(formulaValue(`=REACTION.CHECK("${balanced as string}")`)).toBe(true);
  });
});
