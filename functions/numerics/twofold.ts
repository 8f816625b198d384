/**
 * What rounding loses, as a second number: error-free sums and products of doubles.
 *
 * Exact as long as products and 1e9 times the operands do not overflow, and products stay above
 * 1e-290, so that their errors do not underflow.
 */

/** 2^27 + 1: splits 53 bits into two halves whose products are exact (Veltkamp; Dekker 1971). */
const SPLITTER = 134217729;

/**
 * The error of a rounded sum: `a + b - sum` exactly, where `sum` is the rounded `a + b`.
 *
 * Source: Knuth, The Art of Computer Programming 2, section 4.2.2, theorem B.
 */
export function sumError(a: number, b: number, sum: number): number {
  const roundedB = sum - a;
  return a - (sum - roundedB) + (b - roundedB);
}

/**
 * The error of a rounded product: `a b - product` exactly, where `product` is the rounded `a b`.
 *
 * Source: Dekker, A floating-point technique for extending the available precision,
 * Numerische Mathematik 18 (1971) 224-242.
 */
export function productError(a: number, b: number, product: number): number {
  const scaledA = SPLITTER * a;
  const highA = scaledA - (scaledA - a);
  const lowA = a - highA;
  const scaledB = SPLITTER * b;
  const highB = scaledB - (scaledB - b);
  const lowB = b - highB;
  return lowA * lowB - (product - highA * highB - lowA * highB - highA * lowB);
}

/**
 * `a b - c d`, rounded once: a relative error of 2^-53 however much cancels, and an exact zero
 * exactly when the products are equal.
 *
 * ## Method
 * 1. Both products and their difference, each with its error.
 * 2. The difference of the two product errors joins the leading part: where the leading parts have
 *    cancelled, their difference is exact and these errors are all that is left.
 * 3. The rest, now far below the result, is added last.
 */
export function differenceOfProducts(a: number, b: number, c: number, d: number): number {
  const left = a * b;
  const right = c * d;
  const high = left - right;
  const low = sumError(left, -right, high);

  const leftError = productError(a, b, left);
  const rightError = productError(c, d, right);
  const errors = leftError - rightError;
  const errorsLow = sumError(leftError, -rightError, errors);

  const result = high + errors;
  return result + (sumError(high, errors, result) + (low + errorsLow));
}

/** `a + b c`, rounded once. */
export function sumWithProduct(a: number, b: number, c: number): number {
  return differenceOfProducts(a, 1, -b, c);
}
