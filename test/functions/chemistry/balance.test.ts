import fc from 'fast-check';
import { expect, test } from 'vitest';
import { balanceEquation } from '../../../functions/chemistry/balance.ts';
import { balancedEquation } from '../../../functions/chemistry/balancedEquation.ts';
import { isInputError } from '../../../functions/errors.ts';
import { messageOf } from '../raises.ts';

// textbook equations, balanced by hand
test.each([
  ['C3H8 + O2 = CO2 + H2O', 'C3H8 + 5 O2 = 3 CO2 + 4 H2O'],
  ['2 H2 + 2 O2 = 2 H2O', '2 H2 + O2 = 2 H2O'],
  ['MnO4- + Fe^2+ + H+ = Mn^2+ + Fe^3+ + H2O', 'MnO4- + 5 Fe^2+ + 8 H+ = Mn^2+ + 5 Fe^3+ + 4 H2O'],
  ['Cr2O7^2- + H+ + e^- = Cr^3+ + H2O', 'Cr2O7^2- + 14 H+ + 6 e^- = 2 Cr^3+ + 7 H2O'],
  ['Fe2O3(s) + CO(g) = Fe3O4(s) + CO2(g)', '3 Fe2O3(s) + CO(g) = 2 Fe3O4(s) + CO2(g)'],
  ['CuSO4·5H2O(s) = CuSO4(s) + H2O(g)', 'CuSO4·5H2O(s) = CuSO4(s) + 5 H2O(g)'],
  ['Fe0.5O + CO = Fe + CO2', '2 Fe0.5O + 2 CO = Fe + 2 CO2'],
  [
    'K4[Fe(CN)6] + KMnO4 + H2SO4 = KHSO4 + Fe2(SO4)3 + MnSO4 + HNO3 + CO2 + H2O',
    '10 K4[Fe(CN)6] + 122 KMnO4 + 299 H2SO4 = 162 KHSO4 + 5 Fe2(SO4)3 + 122 MnSO4 + 60 HNO3 + 60 CO2 + 188 H2O',
  ],
])('%s is balanced as %s', (text, balanced) => {
  expect(balanceEquation(text)).toBe(balanced);
});

test.each([
  ['CO + CO2 + H2 = CH3OH + H2O', 2],
  ['H2O2 + MnO4- + H+ = Mn^2+ + O2 + H2O', 2],
])('%s can be balanced in several ways', (text, count) => {
  expect(messageOf('balance-not-unique', () => balanceEquation(text))).toContain(
    `in ${count} independent ways`,
  );
});

test.each([
  ['H2 = O2', 'cannot all be equal'],
  ['H2 + O2 = H2O + He', 'He would take no part'],
  ['N2 + NH3 = H2', 'N2 would have to stand on the other side'],
])('%s cannot be balanced, and the reason is given', (text, reason) => {
  expect(messageOf('balance-none', () => balanceEquation(text))).toContain(reason);
});

test('a name cannot be balanced', () => {
  expect(messageOf('composition-missing', () => balanceEquation('acid + H2O = CO2'))).toContain('acid');
});

test('what is balanced passes the check, and has no common factor', () => {
  // of four species that hold three elements one balance is the rule; the sides are drawn at random
  const species = fc.constantFrom('CH4', 'O2', 'CO2', 'H2O', 'CO', 'H2', 'C2H6', 'CH3OH');
  let balanced = 0;
  fc.assert(
    fc.property(
      fc.uniqueArray(species, { minLength: 3, maxLength: 4 }),
      fc.integer({ min: 1, max: 2 }),
      (chosen, at) => {
        const text = `${chosen.slice(0, at).join(' + ')} = ${chosen.slice(at).join(' + ')}`;
        try {
          const answer = balancedEquation(balanceEquation(text));
          balanced += 1;
          expect(answer.check).toBe('balanced');
          const common = [2, 3, 5, 7].filter((prime) => answer.stoichiometry.every((nu) => nu % prime === 0));
          expect(common).toEqual([]);
        } catch (thrown) {
          if (!isInputError(thrown)) throw thrown;
        }
      },
    ),
    { seed: 51, numRuns: 1500 },
  );
  expect(balanced).toBeGreaterThan(20);
});
