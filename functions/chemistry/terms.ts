/**
 * The texts of the terms on one side of an equation, in plain notation.
 *
 * `+` is both the sign between terms and a charge. It is a charge
 * - after `^`, with a number between or not: `Ca^2+`, `Ca^+2`;
 * - attached to a text when the side ends, another `+` or a phase tag follows: `Na+ + Cl-`, `H+(aq)`,
 *   `Na++Cl-` (the last `+` before a term is always the sign between them);
 * - attached to a text with only a number between it and one of those: `Ca+2 + SO4-2`.
 *
 * Every other `+` is the sign between terms, with or without spaces: `A+B`, `A +B`, `A+ 2B`.
 */
export function splitTerms(side: string): string[] {
  const terms: string[] = [];
  let start = 0;
  for (let at = side.indexOf('+'); at >= 0; at = side.indexOf('+', at + 1)) {
    if (isCharge(side, at)) continue;
    terms.push(side.slice(start, at).trim());
    start = at + 1;
  }
  terms.push(side.slice(start).trim());
  return terms;
}

/** What follows a charge: the end, another plus, or a phase tag; a number may stand between. */
const AFTER_CHARGE = /[1-9]? ?(?:$|\+|\((?:g|l|s|aq)[,)])/y;

/** Longest charge before its sign, as in ^12+. */
const CARET_AND_NUMBER = 3;

function isCharge(side: string, at: number): boolean {
  if (/\^\d*$/.test(side.slice(Math.max(0, at - CARET_AND_NUMBER), at))) return true;
  if (at === 0 || side[at - 1] === ' ') return false;
  AFTER_CHARGE.lastIndex = at + 1;
  return AFTER_CHARGE.test(side);
}
