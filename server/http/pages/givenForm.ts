/** What is given, each value a field where it stands; works without a script. */
import type { InputValue } from '../../evaluation.ts';
import { limitsOf, ownValue } from '../../render/given.ts';
import { html, type Markup } from '../../render/html.ts';
import type { Page } from '../../render/page.ts';
import { padSection } from '../../render/section.ts';
import { readReference } from '../../workbook/address.ts';

/** `name` is that of the workbook in the address. */
export function givenForm(name: string): (page: Page) => Markup | null {
  const address = `/sheets/${encodeURIComponent(name)}`;
  return (page) => {
    const inputs = Object.entries(page.evaluation.inputs);
    if (inputs.length === 0) return null;
    const lines = inputs.map(([input, value], index) => {
      const cell = readReference(value.cell);
      const id = `given-${index + 1}`;
      return {
        reference: cell && page.linkTo(cell),
        calculation: html`<p>
            <label for="${id}">${input}</label> <span id="${id}-limits">${limitsOf(value)}</span>
          </p>
          ${ownValue(value)}`,
        output: html`${field(id, input, value)}${unitOf(value)}`,
      };
    });
    const again = {
      reference: null,
      calculation: html`<p class="again"><a href="${address}">The workbook’s own values</a></p>`,
      output: html`<button type="submit">Work it again</button>`,
    };
    return html`<form method="get" action="${address}">
      ${padSection('given', 'Given', [...lines, again])}
    </form>`;
  };
}

function field(id: string, name: string, { value, min, max }: InputValue): Markup {
  const shared = html`id="${id}" name="${name}" aria-describedby="${id}-limits" autocomplete="off"`;
  if (typeof value !== 'number') return html`<input type="text" ${shared} value="${textOf(value)}" />`;
  const lowest = min === null ? null : html` min="${min}"`;
  const highest = max === null ? null : html` max="${max}"`;
  return html`<input
    type="number"
    step="any"
    required="required"
    ${shared}
    value="${value}"
    ${lowest}${highest}
  />`;
}

function textOf(value: Exclude<InputValue['value'], number>): string {
  if (typeof value === 'boolean') return value ? 'TRUE' : 'FALSE';
  return typeof value === 'string' ? value : '';
}

function unitOf({ unit }: InputValue): Markup | null {
  return unit === null ? null : html` <span class="unit">${unit}</span>`;
}
