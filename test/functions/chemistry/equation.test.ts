import { describe, expect, test } from 'vitest';
import { parseEquation } from '../../../functions/chemistry/equation.ts';
import { messageOf } from '../raises.ts';

const AMMONIA = 'N2(g) + 3 H2(g) = 2 NH3(g)';

test('an equation gives its species and stoichiometric numbers in the order of the text', () => {
  const reaction = parseEquation(AMMONIA);
  expect(reaction.text).toBe(AMMONIA);
  expect(reaction.species.map(({ text }) => text)).toEqual(['N2(g)', 'H2(g)', 'NH3(g)']);
  expect(reaction.stoichiometry).toEqual([-1, -3, 2]);
  expect(reaction.reactantCount).toBe(2);
});

test.each(['=', '<=>', '<->', '->', '⇌', '⇄', '→', '↔'])('%s is the reversible sign', (sign) => {
  expect(parseEquation(`N2(g)+3H2(g)${sign}2NH3(g)`).text).toBe(AMMONIA);
  expect(parseEquation(`N2(g) + 3 H2(g) ${sign} 2 NH3(g)`).text).toBe(AMMONIA);
});

test.each([
  ['1/2 O2 + H2 = H2O', [-1 / 2, -1, 1]],
  ['0.5O2 + H2 = H2O', [-0.5, -1, 1]],
  ['1/3A=2/3B', [-1 / 3, 2 / 3]],
  ['2(NH4)2SO4 = 4NH3 + 2H2SO4', [-2, 4, 2]],
  ['2e- + 2 H+ = H2', [-2, -2, 1]],
  ['1.5 ester = 3/2 acid', [-1.5, 1.5]],
])('the coefficients of %s are read', (text, stoichiometry) => {
  expect(parseEquation(text).stoichiometry).toEqual(stoichiometry);
});

test('an arrow after a charge is told apart from it', () => {
  expect(parseEquation('Na+ + Cl-->NaCl').text).toBe('Na+ + Cl- = NaCl');
});

describe('an equation that cannot be read is an error that says where', () => {
  test.each(['A + B', '', 'A = B = C', 'A == B', '2 NH3'])('"%s" has not one sign', (text) => {
    expect(messageOf('equation-sign', () => parseEquation(text))).toContain('one is wanted');
  });

  test.each([
    ['= B', 'left'],
    ['A =', 'right'],
    ['A -> ', 'right'],
  ])('"%s" has nothing on the %s', (text, side) => {
    expect(messageOf('equation-side-empty', () => parseEquation(text))).toContain(`on the ${side}`);
  });

  test.each([
    ['A + = B', 'term 2 on the left'],
    ['A + + B = C', 'term 2 on the left'],
    ['A = B + 0,5 C', 'term 2 on the right'],
    ['A = 2', 'term 1 on the right'],
    ['A = B + *C', 'term 2 on the right'],
    ['A = B + 1/2/3 C', 'term 2 on the right'],
    ['A = 1-butene', 'term 1 on the right'],
  ])('"%s": %s', (text, place) => {
    expect(messageOf('equation-term', () => parseEquation(text))).toContain(place);
  });

  test.each(['0 A = B', '-2 A = B', '0.0 A = B', '0/3 A = B', '1/0 A = B'])(
    '"%s" has a coefficient not above 0',
    (text) => {
      expect(messageOf('equation-coefficient', () => parseEquation(text))).toContain('coefficient above 0');
    },
  );

  test.each([
    ['A + A = B', 'both on the left'],
    ['A = B + A', 'once on each side'],
    ['Na^+ + X = Na+ + Y', 'once on each side'],
  ])('"%s" has a species %s', (text, where) => {
    expect(messageOf('equation-doubled', () => parseEquation(text))).toContain(where);
  });

  test('a species may stand in two phases', () => {
    expect(parseEquation('H2O(l) = H2O(g)').species).toHaveLength(2);
  });

  test('a text beyond 1000 characters is refused', () => {
    expect(messageOf('equation-too-long', () => parseEquation(`A = ${'B'.repeat(1000)}`))).toContain('1004');
  });

  test('an error in a species is that of the species', () => {
    expect(messageOf('formula-two-readings', () => parseEquation('Fe3+ + e^- = Fe^2+'))).toContain('Fe^3+');
  });
});
