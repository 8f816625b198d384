/** How the numbers of a check are shown: the found ones with no more digits than its tolerance can tell apart. */
import type { CheckResult } from '../evaluation.ts';
import { numberText } from './numberText.ts';

type Within = CheckResult['within'][string];

const PER_CENT = 100;
/** A digit beyond the first of the tolerance, and the count starts at one. */
const DIGITS_BEYOND = 2;

/**
 * Significant digits of a found number: to one place beyond the tolerance, and never more than the number
 * has. All of them where the check did not pass, so that no rounding hides why; null for whole numbers.
 */
export function foundDigits(value: number, within: Within, passed: boolean): number | null {
  const all = allDigits(value);
  const allowed = allowedAround(value, within);
  if (all === null || !passed || allowed === 0) return all;
  return Math.min(all, Math.max(1, powerOf(value) - powerOf(allowed) + DIGITS_BEYOND));
}

/** The digits that tell the number from every other; null for whole numbers, which are shown whole. */
export function allDigits(value: number): number | null {
  if (Number.isInteger(value)) return null;
  const [mantissa = ''] = value.toExponential().split('e');
  return mantissa.replace(/\D/g, '').length;
}

/** `0.001`, or `50 %`. */
export function toleranceText(within: NonNullable<Within>): string {
  return 'absolute' in within ? numberText(within.absolute) : `${numberText(within.relative * PER_CENT)} %`;
}

function allowedAround(value: number, within: Within): number {
  if (within === null) return 0;
  return 'absolute' in within ? within.absolute : within.relative * Math.abs(value);
}

/** The power of ten of the first digit. */
function powerOf(value: number): number {
  return Number(value.toExponential().split('e')[1]);
}
