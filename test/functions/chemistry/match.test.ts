import { expect, test } from 'vitest';
import { parseEquation } from '../../../functions/chemistry/equation.ts';
import { matchSpecies } from '../../../functions/chemistry/match.ts';
import { messageOf } from '../raises.ts';

const ammonia = parseEquation('N2(g) + 3 H2(g) = 2 NH3(g)');
const boiling = parseEquation('H2O(l) = H2O(g)');
const calcite = parseEquation('CaCO3(s,calcite) = Ca^2+(aq) + CO3^2-(aq)');
const polymorphs = parseEquation('CaCO3(s,aragonite) = CaCO3(s,calcite)');
const untagged = parseEquation('acid + alcohol = ester + H2O');

test.each([
  ['its own text', ammonia, 'NH3(g)', 2],
  ['another spelling', ammonia, 'NH₃ (g)', 2],
  ['no tag, where one species is possible', ammonia, 'NH3', 2],
  ['a tag, where the equation has none', untagged, 'H2O(l)', 3],
  ['a name', untagged, 'ester', 2],
  ['a phase without the form', calcite, 'CaCO3(s)', 0],
  ['neither phase nor form', calcite, 'CaCO3', 0],
  ['another spelling of the charge', calcite, 'Ca^+2', 1],
  ['the exact one of two phases', boiling, 'H2O(g)', 1],
  ['the exact one of two forms', polymorphs, 'CaCO3(s,calcite)', 1],
])('a label matches by %s', (_, reaction, label, index) => {
  expect(matchSpecies(reaction, label)).toBe(index);
});

test.each([
  ['another phase', ammonia, 'NH3(aq)'],
  ['another species', ammonia, 'Ar'],
  ['another form', calcite, 'CaCO3(s,vaterite)'],
  ['another charge', calcite, 'Ca'],
  ['another capital', untagged, 'Ester'],
])('a label of %s matches nothing', (_, reaction, label) => {
  expect(matchSpecies(reaction, label)).toBeNull();
});

test.each([
  [boiling, 'H2O', 'H2O(l), H2O(g)'],
  [polymorphs, 'CaCO3(s)', 'CaCO3(s,aragonite), CaCO3(s,calcite)'],
])('a label that can be two species is an error that shows both', (reaction, label, candidates) => {
  expect(messageOf('species-two-readings', () => matchSpecies(reaction, label))).toContain(candidates);
});

test('a label that cannot be read is an error', () => {
  messageOf('formula-two-readings', () => matchSpecies(calcite, 'Ca2+'));
});
