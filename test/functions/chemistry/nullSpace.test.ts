import fc from 'fast-check';
import { expect, test } from 'vitest';
import { nullSpace } from '../../../functions/chemistry/nullSpace.ts';
import { add, multiply, rational, type Rational, ZERO } from '../../../functions/chemistry/rational.ts';

const exact = (rows: readonly (readonly number[])[]) =>
  rows.map((row) => row.map((entry) => rational(BigInt(entry))));
const dot = (a: readonly Rational[], b: readonly Rational[]) =>
  a.reduce((sum, entry, i) => add(sum, multiply(entry, b[i]!)), ZERO);

test('a regular matrix has none, a zero one all', () => {
  expect(
    nullSpace(
      exact([
        [2, 1],
        [1, 1],
      ]),
    ),
  ).toEqual([]);
  expect(nullSpace(exact([[0, 0, 0]]))).toHaveLength(3);
});

test('every vector solves the equations, and there are columns less rank of them', () => {
  const matrices = fc
    .tuple(fc.integer({ min: 1, max: 5 }), fc.integer({ min: 1, max: 6 }))
    .chain(([rows, columns]) =>
      fc.array(fc.array(fc.integer({ min: -4, max: 4 }), { minLength: columns, maxLength: columns }), {
        minLength: rows,
        maxLength: rows,
      }),
    );
  fc.assert(
    fc.property(matrices, (rows) => {
      const A = exact(rows);
      const basis = nullSpace(A);
      for (const row of A) for (const vector of basis) expect(dot(row, vector)).toEqual(ZERO);
      // the null space of the null space's vectors is the row space, so that the sizes add up
      const rank = basis.length === 0 ? rows[0]!.length : nullSpace(basis).length;
      expect(rank + basis.length).toBe(rows[0]!.length);
      expect(basis.length).toBeGreaterThanOrEqual(rows[0]!.length - rows.length);
    }),
    { seed: 21 },
  );
});
