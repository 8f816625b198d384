import { inputError } from '../errors.ts';

/** Two numbers about a dot, perhaps a third, and what follows: water, more of the formula, or nothing. */
const DOT_BETWEEN_FIGURES = /(\d+)\.(\d+)(?:\.(\d+))?(?=(H2O(?![\da-z])|[A-Z([])?)/g;

const OTHER_DOT = /(?<!\d)\.|\.(?!\d)/g;

/**
 * The formula with each dot told apart: `·` before an adduct such as water, `.` in a decimal.
 *
 * A dot that is not between figures joins an adduct (`Ca(OH)2.H2O`). Between figures it is a decimal
 * point (`Fe0.947O`, `La1.85Sr0.15CuO4`), unless
 *
 * - the figures after it count H2O: `CuSO4.5H2O` is `CuSO4·5H2O`, `CaSO4.0.5H2O` is `CaSO4·0.5H2O`;
 * - one figure and then more of the formula follows, as in `MgCl2.6NH3`, where both readings are
 *   plausible: an error that shows both.
 */
export function tellDotsApart(formula: string): string {
  return formula
    .replace(DOT_BETWEEN_FIGURES, (run: string, a: string, b: string, c?: string, next?: string) => {
      const aCountsAtoms = !a.startsWith('0');
      if (c !== undefined) {
        if (!aCountsAtoms) return `${a}.${b}·${c}`;
        if (b === '0' && next === 'H2O') return `${a}·${b}.${c}`;
        throw twoReadings(formula, run, `${a}·${b}.${c}`, `${a}.${b}·${c}`);
      }
      if (!aCountsAtoms || b.startsWith('0') || next === undefined) return run;
      if (next === 'H2O') return `${a}·${b}`;
      if (b.length === 1) throw twoReadings(formula, run, `${a}·${b}`, `${a}.${b}0`);
      return run;
    })
    .replace(OTHER_DOT, '·');
}

function twoReadings(text: string, run: string, first: string, second: string) {
  return inputError('formula-two-readings', {
    text,
    first: text.replace(run, first),
    second: text.replace(run, second),
  });
}
