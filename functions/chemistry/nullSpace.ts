import { divide, isZero, multiply, ONE, type Rational, subtract, ZERO } from './rational.ts';

/**
 * A basis of the vectors x with A x = 0, exactly.
 *
 * @param A rows of equal length, at least one; not changed
 *
 * ## Method
 * 1. Reduced row echelon form by Gauss and Jordan; no pivoting is needed in exact arithmetic.
 * 2. One vector for each column without a pivot, with 1 there and 0 in the others.
 */
export function nullSpace(A: readonly (readonly Rational[])[]): Rational[][] {
  const rows = A.map((row) => [...row]);
  const columns = rows[0]!.length;
  const pivots: number[] = [];
  for (let column = 0; column < columns && pivots.length < rows.length; column += 1) {
    const found = rows.findIndex((row, i) => i >= pivots.length && !isZero(row[column]!));
    if (found < 0) continue;
    const at = pivots.push(column) - 1;
    [rows[at], rows[found]] = [rows[found]!, rows[at]!];
    const pivot = rows[at][column]!;
    rows[at] = rows[at].map((entry) => divide(entry, pivot));
    for (let i = 0; i < rows.length; i += 1) {
      const factor = rows[i]![column]!;
      if (i === at || isZero(factor)) continue;
      rows[i] = rows[i]!.map((entry, j) => subtract(entry, multiply(factor, rows[at]![j]!)));
    }
  }

  const free = [...Array(columns).keys()].filter((column) => !pivots.includes(column));
  return free.map((chosen) => {
    const vector: Rational[] = Array<Rational>(columns).fill(ZERO);
    vector[chosen] = ONE;
    pivots.forEach((column, i) => (vector[column] = subtract(ZERO, rows[i]![chosen]!)));
    return vector;
  });
}
