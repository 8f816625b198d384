import { expect, test } from 'vitest';
import { ATOMIC_WEIGHTS } from '../../../functions/data/atomicWeights.ts';

test('there are 118 elements, 84 of them with a standard weight', () => {
  const weights = [...ATOMIC_WEIGHTS.values()];
  expect(weights).toHaveLength(118);
  expect(weights.filter((weight) => weight !== null)).toHaveLength(84);
});

test('no symbol is a small letter away from the form of one', () => {
  for (const symbol of ATOMIC_WEIGHTS.keys()) expect(symbol).toMatch(/^[A-Z][a-z]?$/);
});

// CODATA 2018, relative atomic mass of nuclides in nature as the only stable one (from memory): an
// element with one stable nuclide weighs what that nuclide does.
test.each([
  ['F', 18.998403],
  ['Na', 22.98977],
  ['Al', 26.981538],
  ['P', 30.973762],
  ['I', 126.90447],
  ['Au', 196.96657],
])('%s weighs what its one stable nuclide does', (symbol, nuclide) => {
  const { gramPerMol } = ATOMIC_WEIGHTS.get(symbol)!;
  // abridged to five digits, so off by half of the fifth at the most
  expect(Math.abs(gramPerMol - nuclide)).toBeLessThanOrEqual(gramPerMol > 100 ? 5.1e-3 : 5.1e-4);
});

test('a weight recalled from memory says so', () => {
  const recalled = [...ATOMIC_WEIGHTS].filter(([, weight]) => weight?.standing === 'from memory');
  expect(recalled.map(([symbol]) => symbol)).toEqual(['Se']);
});
