/** Equations and species as MathML, which browsers set with the fonts of the system. */
import temml from 'temml';
import { parseEquation } from '../../../functions/chemistry/equation.ts';
import { parseSpecies } from '../../../functions/chemistry/species.ts';
import { InputError } from '../../../functions/errors.ts';
import { html, verbatim, type Markup } from '../html.ts';
import { equationTex } from './equationTex.ts';
import { speciesTex } from './speciesTex.ts';

/** The equation on its own line; null where the text does not read as one. */
export function equationMarkup(text: string): Markup | null {
  const reaction = readOrNull(parseEquation, text);
  return reaction && html`<div class="equation">${mathml(equationTex(reaction), true)}</div>`;
}

/** A species within a line or a table; as it is written where it does not read as one. */
export function speciesMarkup(text: string): Markup {
  const species = readOrNull(parseSpecies, text);
  return species === null ? html`${text}` : mathml(speciesTex(species), false);
}

function mathml(tex: string, displayMode: boolean): Markup {
  return verbatim(temml.renderToString(tex, { displayMode, throwOnError: true }));
}

function readOrNull<Read>(read: (text: string) => Read, text: string): Read | null {
  try {
    return read(text);
  } catch (error) {
    if (error instanceof InputError) return null;
    throw error;
  }
}
