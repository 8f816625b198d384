/** What is given: the inputs by name, with their limits and uncertainty. */
import { readReference } from '../workbook/address.ts';
import type { InputValue } from '../evaluation.ts';
import { html, joined, type Markup, type Part } from './html.ts';
import { numberMarkup } from './numberText.ts';
import type { Page } from './page.ts';
import { padSection } from './section.ts';
import { resultMarkup, valueMarkup } from './values.ts';

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
        calculation: html`<p><span class="name">${name}</span> ${limitsOf(input)}</p>
          ${ownValue(input)}`,
        output: resultMarkup(input.value, { unit: input.unit, digits: null }),
      };
    }),
  );
}

/** That the sheet was worked with other values than the workbook's own, and for which inputs. */
export function otherValues({ evaluation }: Page): Markup | null {
  const changed = Object.entries(evaluation.inputs).filter(([, input]) => isChanged(input));
  if (changed.length === 0) return null;
  const names = changed.map(([name]) => name).join(', ');
  return html`<p class="verdict">Worked with other values than the workbook’s own: ${names}.</p>`;
}

/** `the workbook has 850`, beside a value that is another one. */
export function ownValue(input: InputValue): Part {
  return isChanged(input) ? html`<p>the workbook has ${valueMarkup(input.own)}</p>` : null;
}

/** An input is a typed cell, so that neither value is an error. */
function isChanged({ value, own }: InputValue): boolean {
  return value !== own;
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
