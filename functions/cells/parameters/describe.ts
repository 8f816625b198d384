import type { CellValue } from '../entry.ts';

/** What a person would call this value in a message: `the text "high"`, `a range of 3 x 2`, `nothing`. */
export function describe(given: CellValue): string {
  if (given === null) return 'blank';
  if (typeof given === 'number') return `the number ${given}`;
  if (typeof given === 'boolean') return given ? 'TRUE' : 'FALSE';
  if (typeof given === 'string') return `the text "${shortened(given)}"`;
  return `a range of ${given.length} x ${given[0]!.length}`;
}

const LONGEST_QUOTED_TEXT = 60;

function shortened(text: string): string {
  return text.length <= LONGEST_QUOTED_TEXT ? text : `${text.slice(0, LONGEST_QUOTED_TEXT)}...`;
}
