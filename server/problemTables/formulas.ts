import type { ErrorTemplate } from '../../functions/errorTable.ts';

/** Errors of a formula that the engine cannot take: its cell shows them, the other cells keep their values. */
export const FORMULA_ERRORS = {
  'formula-too-long': {
    says: 'the formula has {length} characters, and the limit is {limit}',
    remedy: 'Work parts of it in cells of their own.',
  },
  'formula-too-deep': {
    says: 'brackets in the formula are nested {depth} deep, and the limit is {limit}',
    remedy: 'Work the inner parts in cells of their own.',
  },
  'formula-too-many-signs': {
    says: 'the formula has {count} signs such as + and &, and the limit is {limit}',
    remedy: 'Work parts of it in cells of their own, or use SUM over a range.',
  },
  'formula-character': {
    says: 'the formula holds {character} at place {place}, which means nothing there',
    remedy: '{help}',
  },
  'formula-name': {
    says: 'the formula holds the word {name}, which is no name of this workbook',
    remedy: '{nearest} Text in a formula stands in double quotes.',
  },
} as const satisfies Record<string, ErrorTemplate>;
