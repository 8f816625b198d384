import { inputError } from '../../errors.ts';
import type { Quantity, Unit } from './unit.ts';

/** A value in base units of its quantity. */
export function toBase(value: number, { zero, numerator, denominator }: Unit): number {
  return ((value + zero) * numerator) / denominator;
}

/**
 * A value of one unit in another of the same quantity; itself where the unit is the same.
 *
 * A gas volume is the amount of ideal gas in it, and converts to one.
 * Errors: unit-incompatible, naming both quantities.
 */
export function convertValue(value: number, from: Unit, to: Unit): number {
  if (from.text === to.text) return value;
  refuseIncompatible(from, to);
  return scale(value + from.zero, from, to) - to.zero;
}

/** A difference or standard uncertainty in another unit: 2 degC of uncertainty is 2 K. */
export function convertDifference(difference: number, from: Unit, to: Unit): number {
  if (from.text === to.text) return difference;
  refuseIncompatible(from, to, SAME_DIFFERENCE);
  return scale(difference, from, to);
}

/** One multiplication and one division, each by a ratio that is exact for most pairs of units. */
function scale(value: number, from: Unit, to: Unit): number {
  return (value * (from.numerator * to.denominator)) / (from.denominator * to.numerator);
}

function refuseIncompatible(from: Unit, to: Unit, same = SAME_BASE): void {
  if (measuredAs(from, same) === measuredAs(to, same)) return;
  throw inputError('unit-incompatible', {
    from: from.text,
    fromQuantity: describe(from),
    to: to.text,
    toQuantity: describe(to),
  });
}

const SAME_BASE: Partial<Record<Quantity, Quantity>> = {
  'gas volume': 'amount',
  'gas volume flow': 'amount flow',
};

/** The barometer drops out of a difference. */
const SAME_DIFFERENCE: typeof SAME_BASE = { ...SAME_BASE, 'gauge pressure': 'pressure' };

/** Units convert into each other when this is the same. */
function measuredAs({ quantity, dimensions, as }: Unit, same: typeof SAME_BASE): string {
  return `${same[quantity] ?? quantity} ${dimensions} ${as?.name ?? ''}`;
}

function describe({ quantity, as }: Unit): string {
  if (quantity === 'none') return 'a pure number';
  if (quantity === 'other') return 'another quantity';
  return as === null ? quantity : `${quantity} as ${as.name}`;
}
