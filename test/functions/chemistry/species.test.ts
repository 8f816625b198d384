import { describe, expect, test } from 'vitest';
import { parseSpecies } from '../../../functions/chemistry/species.ts';
import { messageOf } from '../raises.ts';

describe('one species has one canonical text, however it is written', () => {
  test.each([
    ['SO4^2-', ['SO₄²⁻', 'SO4^-2', 'SO4-2', ' SO4^2- ', 'SO4^2−']],
    ['Na+', ['Na^+', 'Na⁺', 'Na^1+', 'Na+1']],
    ['I3^-', ['I₃⁻']],
    ['e^-', ['e-', 'e⁻']],
    ['CuSO4·5H2O', ['CuSO4.5H2O', 'CuSO₄•5H₂O', 'CuSO4·5.0H2O']],
    ['CaSO4·1/2H2O', ['CaSO4·0.5H2O', 'CaSO4.0.5H2O']],
    ['CaCO3(s,calcite)', ['CaCO3 (s, calcite)', 'CaCO3(s,calcite)', 'CaCO₃( s , calcite )']],
    ['NH4+(aq)', ['NH4^+ (aq)', 'NH₄⁺(aq)']],
    ['Y1.50Ba2Cu3O6.9', ['Y1.500Ba2Cu3O6.90']],
    ['acetic acid(l)', ['acetic   acid (l)']],
  ])('%s', (canonical, spellings) => {
    for (const spelling of [canonical, ...spellings]) expect(parseSpecies(spelling).text).toBe(canonical);
  });
});

test('a formula has composition, charge and tag', () => {
  const { composition, ...species } = parseSpecies('HCO3-(aq)');
  expect(species).toMatchObject({ text: 'HCO3-(aq)', name: 'HCO3-', phase: 'aq', form: null, charge: -1 });
  expect(Object.fromEntries(composition!)).toEqual({ H: 1, C: 1, O: 3 });
  expect(parseSpecies('H2O').charge).toBe(0);
});

test('the electron has a charge and no atoms', () => {
  const electron = parseSpecies('e^-');
  expect(electron.charge).toBe(-1);
  expect(electron.composition!.size).toBe(0);
});

describe('formula or name', () => {
  test.each([
    'ester',
    'e',
    'n-C4H10',
    'acetic acid',
    'r-22',
    'edta^4-',
    'Water',
    'Bacon',
    'Cocoa',
    'HA',
    'A',
    'D',
    'T',
    'M^2+',
    'A-',
    'X',
    'Acetic acid',
    'THF',
    'ATP',
    'été',
    '水',
  ])('%s is a name', (text) => {
    expect(parseSpecies(text).composition).toBeNull();
    expect(parseSpecies(text).text).toBe(text);
  });

  test.each(['CO', 'Co', 'Pb', 'Ca', 'HNO', 'B', 'I', 'Cs', 'HAc', 'Ac-', 'COS', 'Tc'])(
    '%s is a formula, because it divides into symbols',
    (text) => {
      expect(parseSpecies(text).composition).not.toBeNull();
    },
  );

  test('a name has the charge that is written, or none that is known', () => {
    expect(parseSpecies('A^2-').charge).toBe(-2);
    expect(parseSpecies('HA').charge).toBeNull();
  });

  test.each([
    ['NaCL', 'NaCl'],
    ['MGO', 'MgO'],
    ['HCL', 'HCl'],
    ['NAOH', 'NaOH'],
  ])('%s is a slip for %s, and is not taken for a name', (text, formula) => {
    expect(messageOf('name-or-formula', () => parseSpecies(text))).toContain(`Write ${formula}, or begin`);
  });

  test.each([
    ['Xy2', 'Xy', 1],
    ['CaCL2', 'L', 4],
    ['NaCX3', 'X', 4],
    ['H2A', 'A', 3],
    ['(Zz)2', 'Zz', 2],
  ])('%s has an unknown element and is not taken for a name', (text, symbol, position) => {
    expect(messageOf('element-unknown', () => parseSpecies(text))).toContain(
      `${symbol}, at character ${position} of`,
    );
  });

  test.each(['', '  ', '2NH3', '+', '^+', '(g)', '%', 'acid NaOH', '1-butene', 'a*b', '-'])(
    '"%s" is neither',
    (text) => {
      expect(messageOf('species-unreadable', () => parseSpecies(text))).toContain('Write a formula such as');
    },
  );

  test('a text beyond 120 characters is not read, and not repeated in full', () => {
    expect(messageOf('species-unreadable', () => parseSpecies('C'.repeat(5000))).length).toBeLessThan(400);
  });
});

test.each([
  'CaCO3(calcite)',
  'H2O(G)',
  'CaCO3(S)',
  'H2O(gas)',
  'H2O(g,hot)',
  'CaCO3(s,)',
  'CaCO3(s,a,b)',
  'H2O()',
])('%s has no phase that is known', (text) => {
  expect(messageOf('phase-unknown', () => parseSpecies(text))).toContain('(g), (l), (s) or (aq)');
});
