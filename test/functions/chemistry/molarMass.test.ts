import { expect, test } from 'vitest';
import { molarMass } from '../../../functions/chemistry/molarMass.ts';
import { parseSpecies } from '../../../functions/chemistry/species.ts';
import { messageOf } from '../raises.ts';

// Sums of the abridged weights by hand; CRC Handbook (from memory) prints 18.015, 58.443, 100.087,
// 142.043 (Na2SO4), 249.685 (CuSO4.5H2O), the last digits differing by the abridgement.
test.each([
  ['H2O', 18.015],
  ['NaCl', 58.44],
  ['CaCO3', 100.086],
  ['Na2SO4', 142.036],
  ['CuSO4·5H2O', 249.677],
  ['NH3(g)', 17.031],
  ['Fe0.947O', 68.884215],
])('%s is %d g/mol', (text, gramPerMol) => {
  expect(molarMass(parseSpecies(text))).toBe(gramPerMol);
});

test('electrons have no mass here', () => {
  expect(molarMass(parseSpecies('Na+'))).toBe(molarMass(parseSpecies('Na')));
  expect(molarMass(parseSpecies('e^-'))).toBe(0);
});

test('a name has no molar mass, nor has an element without a standard weight', () => {
  expect(messageOf('composition-missing', () => molarMass(parseSpecies('ester')))).toContain(
    'Write its formula',
  );
  expect(messageOf('weight-missing', () => molarMass(parseSpecies('TcO4-')))).toContain('TcO4- in mol');
});
