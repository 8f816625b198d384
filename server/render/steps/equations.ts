/** The equations that a step works on, typeset: as the author wrote them, or else as they were solved. */
import { cellCount } from '../../workbook/address.ts';
import { formulaTokens } from '../../workbook/formulaTokens.ts';
import { isExtent } from '../evidence/evidence.ts';
import type { Markup } from '../html.ts';
import type { Page } from '../page.ts';
import { equationMarkup } from '../typeset/mathml.ts';
import { referencesOf } from './readingOrder.ts';
import type { PlacedFormula } from './placedFormula.ts';

const HAS_SIGN = /=|->|[\u21C4\u21CC\u2194\u2192]/;
/** Larger ranges are data, not lists of equations. */
const MOST_CELLS = 64;

export function equationsOf(page: Page, placed: PlacedFormula): Markup[] {
  if (placed.formula.answers.length === 0) return [];
  const written = [...new Set([...literals(placed), ...textsRead(page, placed)])].filter((text) =>
    HAS_SIGN.test(text),
  );
  const equations = written.flatMap((text) => equationMarkup(text) ?? []);
  if (equations.length > 0) return equations;
  const solved = placed.formula.answers.flatMap(({ outcome }) =>
    outcome !== null && isExtent(outcome) ? [outcome.problem] : [],
  );
  return solved
    .slice(0, 1)
    .flatMap(({ species, stoichiometry }) => equationMarkup(equationText(species, stoichiometry)) ?? []);
}

function literals({ formula }: PlacedFormula): string[] {
  return formulaTokens(formula.formula)
    .filter(({ kind }) => kind === 'text')
    .map(({ text }) => text.slice(1, -1).replaceAll('""', '"'));
}

function textsRead(page: Page, { formula }: PlacedFormula): string[] {
  return referencesOf(formula.comesFrom)
    .filter((reference) => cellCount(reference) <= MOST_CELLS)
    .flatMap((reference) => page.cells.valuesIn(reference).flat())
    .filter((value) => typeof value === 'string');
}

function equationText(species: readonly string[], stoichiometry: readonly number[]): string {
  const side = (sign: 1 | -1) =>
    species.flatMap((name, index) => {
      const coefficient = sign * (stoichiometry[index] ?? 0);
      return coefficient > 0 ? [coefficient === 1 ? name : `${coefficient} ${name}`] : [];
    });
  return `${side(-1).join(' + ')} = ${side(1).join(' + ')}`;
}
