/** exp() of more than this exceeds what a cell can hold, and of less than its negative is rounded or nothing. */
const LARGEST_LOGARITHM = 709;

/** Whether a cell can hold the number of this natural logarithm. */
export function isHoldable(logarithm: number): boolean {
  return Math.abs(logarithm) <= LARGEST_LOGARITHM;
}
