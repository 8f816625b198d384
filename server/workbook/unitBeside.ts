import { isDeepStrictEqual } from 'node:util';
import { isInputError } from '../../functions/errors.ts';
import { readUnit } from '../../functions/chemistry/units/readUnit.ts';
import type { Unit } from '../../functions/chemistry/units/unit.ts';

/**
 * Whether the text in a cell names another unit than the input's own.
 *
 * What is no unit (a note, a name) says nothing; spellings of one unit (`L`, `litre`) agree.
 */
export function isOtherUnit(unit: string, beside: string): boolean {
  if (unit.trim() === beside.trim()) return false;
  const ofCell = unitOrNull(beside);
  return ofCell !== null && !isDeepStrictEqual(meaning(unitOrNull(unit)), meaning(ofCell));
}

function unitOrNull(text: string): Unit | null {
  try {
    return readUnit(text);
  } catch (error) {
    if (isInputError(error)) return null;
    throw error;
  }
}

/** A unit without its spelling. */
function meaning(unit: Unit | null): Unit | null {
  return unit && { ...unit, text: '' };
}
