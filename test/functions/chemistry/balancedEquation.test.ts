import { expect, test } from 'vitest';
import { balancedEquation } from '../../../functions/chemistry/balancedEquation.ts';
import { messageOf } from '../raises.ts';

test.each([
  'N2(g) + 3 H2(g) = 2 NH3(g)',
  'MnO4- + 5 Fe^2+ + 8 H+ = Mn^2+ + 5 Fe^3+ + 4 H2O',
  'Fe^3+ + e^- = Fe^2+',
  '1/3 N2 + H2 = 2/3 NH3',
  'CuSO4·5H2O(s) = CuSO4(s) + 5 H2O(g)',
  '0.947 Fe + 0.5 O2 = Fe0.947O',
  'H2O(l) = H2O(g)',
])('%s balances', (text) => {
  expect(balancedEquation(text)).toMatchObject({ check: 'balanced', named: [] });
});

test.each([
  ['N2 + H2 = NH3', 'N: 2 on the left, 1 on the right; H: 2 on the left, 3 on the right'],
  ['Fe^3+ + e^- = Fe', 'charge: 2 on the left, 0 on the right'],
  ['H2 = He', 'H: 2 on the left, 0 on the right; He: 0 on the left, 1 on the right'],
  ['0.333 N2 + H2 = 2/3 NH3', 'N: 0.666 on the left, 2/3 on the right'],
  ['0.95 Fe + 0.5 O2 = Fe0.947O', 'Fe: 0.95 on the left, 0.947 on the right'],
])('%s does not, and each difference is named', (text, differences) => {
  expect(messageOf('equation-unbalanced', () => balancedEquation(text))).toContain(differences);
});

test('an equation with a name is not checked, and the names say why', () => {
  expect(balancedEquation('HA + H2O = A- + H3O+')).toMatchObject({
    check: 'not checked',
    named: ['HA', 'A-'],
  });
});

test('one text gives one reaction', () => {
  expect(balancedEquation('H2 + I2 = 2 HI')).toBe(balancedEquation('H2 + I2 = 2 HI'));
});
