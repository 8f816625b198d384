/** What is given: the inputs by name, with their limits and uncertainty. */
import { readReference } from '../workbook/address.ts';
import type { InputValue } from '../evaluation.ts';
import { html, joined, type Markup } from './html.ts';
import { numberMarkup } from './numberText.ts';
import type { Page } from './page.ts';
import { padSection } from './section.ts';
import { resultMarkup } from './values.ts';

export function given(page: Page): Markup | null {
  const inputs = Object.entries(page.evaluation.inputs);
  if (inputs.length === 0) return null;
  return padSection(
    'given',
    'Given',
    inputs.map(([name, input]) => {
      const cell = readReference(input.cell);
      return {
        reference: cell && page.linkTo(cell),
        calculation: html`<p><span class="name">${name}</span> ${limitsOf(input)}</p>`,
        output: resultMarkup(input.value, { unit: input.unit, digits: null }),
      };
    }),
  );
}

/** `at least 0, standard uncertainty 0.05`. */
export function limitsOf({ min, max, uncertainty }: InputValue): Markup {
  const parts = [
    min === null ? null : html`at least ${numberMarkup(min)}`,
    max === null ? null : html`at most ${numberMarkup(max)}`,
    uncertainty === null ? null : html`standard uncertainty ${numberMarkup(uncertainty)}`,
  ];
  return html`<span class="quiet">${joined(parts, ', ')}</span>`;
}
