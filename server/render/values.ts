/** Values of cells as they are read: numbers to sensible digits, words, errors in words. */
import { isError, type Value } from '../evaluation.ts';
import type { Reference } from '../workbook/address.ts';
import { html, type Markup } from './html.ts';
import { lineHeads } from './lineHeads.ts';
import { alignedNumber, numberMarkup, tailWidth } from './numberText.ts';
import type { Page } from './page.ts';

/** A longer list is shown by its beginning and its last row. */
const LONGEST_LIST = 8;
const BEGINNING = 5;
/** More columns do not fit the column for output. */
const MOST_COLUMNS = 2;

export interface Showing {
  readonly unit: string | null;
  readonly digits: number | null;
}

/** One value, set large enough to be found. */
export function resultMarkup(value: Value, { unit, digits }: Showing): Markup {
  const isNumber = typeof value === 'number';
  const unitPart = isNumber && unit !== null ? html` <span class="unit">${unit}</span>` : null;
  return html`<span class="result">${valueMarkup(value, digits)}${unitPart}</span>`;
}

export function valueMarkup(value: Value, digits: number | null = null): Markup {
  if (typeof value === 'number') return numberMarkup(value, digits);
  if (value === null) return html`<span class="quiet">blank</span>`;
  if (typeof value === 'boolean') return html`${value ? 'TRUE' : 'FALSE'}`;
  return isError(value) ? html`<strong class="bad">no value</strong>` : html`${value}`;
}

/** The values of a range as a list with the author's words, or the addresses, before them. */
export function rangeMarkup(page: Page, area: Reference, showing: Showing): Markup {
  const values = page.cells.valuesIn(area);
  const lines = values.length === 1 && (values[0]?.length ?? 0) > 1 ? columnsAsLines(values) : values;
  const width = lines[0]?.length ?? 0;
  if (width > MOST_COLUMNS) {
    return html`<p class="result">${lines.length} rows, ${width} columns</p>
      <p class="quiet">in the source sheet</p>`;
  }
  const heads = lineHeads(page, area, lines.length, lines !== values);
  const isCut = lines.length > LONGEST_LIST;
  const shown = lines
    .map((_, index) => index)
    .filter((index) => !isCut || index < BEGINNING || index === lines.length - 1);
  const tails = tailWidth(
    shown.flatMap((index) => (lines[index] ?? []).filter((value) => typeof value === 'number')),
    showing.digits,
  );
  return html`<table class="list">
    ${caption(showing)}
    <tbody>
      ${shown.map((index) => [
        isCut && index === lines.length - 1 ? omitted(lines.length - BEGINNING - 1, width) : null,
        html`<tr>
          <th scope="row">${heads[index] ?? ''}</th>
          ${(lines[index] ?? []).map((value) => listed(value, tails, showing))}
        </tr>`,
      ])}
    </tbody>
  </table>`;
}

function listed(value: Value, tails: number, { digits }: Showing): Markup {
  return typeof value === 'number'
    ? html`<td class="number">${alignedNumber(value, tails, digits)}</td>`
    : html`<td>${valueMarkup(value)}</td>`;
}

function caption({ unit }: Showing): Markup | null {
  return unit === null
    ? null
    : html`<caption>
        in ${unit}
      </caption>`;
}

function omitted(count: number, width: number): Markup {
  return html`<tr>
    <td class="quiet" colspan="${width + 1}">and ${count} more in the source sheet</td>
  </tr>`;
}

function columnsAsLines(values: readonly (readonly Value[])[]): Value[][] {
  return (values[0] ?? []).map((value) => [value]);
}
