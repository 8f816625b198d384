/** The source sheets: the grid as it was evaluated, with plain rules, and its formulas. */
import { columnLetters } from '../../workbook/address.ts';
import { isError, type Value } from '../../evaluation.ts';
import { html, type Markup } from '../html.ts';
import { alignedNumber, tailWidth } from '../numberText.ts';
import { cellId, type Page } from '../page.ts';
import { section } from '../section.ts';
import { formulaTable } from './formulaTable.ts';

/** Sheets of more columns are printed across the page. */
const MOST_UPRIGHT = 7;

export function sourceSheets(page: Page): Markup {
  const sheets = Object.entries(page.evaluation.sheets);
  return section(
    'source',
    sheets.length === 1 ? 'Source sheet' : 'Source sheets',
    sheets.map(([name, rows], index) => sheetMarkup(page, name, rows, index)),
  );
}

function sheetMarkup(page: Page, name: string, rows: readonly (readonly Value[])[], index: number): Markup {
  const width = Math.max(0, ...rows.map((cells) => cells.length));
  const columns = Array.from({ length: width }, (_, column) => column);
  const tails = columns.map((column) =>
    tailWidth(rows.map((cells) => cells[column] ?? null).filter((value) => typeof value === 'number')),
  );
  const scroll = html`<div class="wide" tabindex="0" role="region" aria-label="Sheet ${name}">
    <table class="grid">
      <caption>
        Sheet ${name}, values
      </caption>
      <thead>
        <tr>
          <td></td>
          ${columns.map((column) => html`<th scope="col">${columnLetters(column)}</th>`)}
        </tr>
      </thead>
      <tbody>
        ${rows.map(
          (cells, row) =>
            html`<tr>
              <th scope="row">${row + 1}</th>
              ${cellsMarkup(cells, { sheet: index, row, width, tails })}
            </tr> `,
        )}
      </tbody>
    </table>
  </div>`;
  return html`<div class="sheet${width > MOST_UPRIGHT ? ' across' : ''}">
    ${scroll}${formulaTable(page, name)}
  </div>`;
}

interface RowPlace {
  readonly sheet: number;
  readonly row: number;
  readonly width: number;
  readonly tails: readonly number[];
}

/** A text runs on over the blank cells to its right. */
function cellsMarkup(cells: readonly Value[], { sheet, row, width, tails }: RowPlace): Markup[] {
  const marks: Markup[] = [];
  for (let column = 0; column < width;) {
    const value = cells[column] ?? null;
    let end = column + 1;
    while (typeof value === 'string' && end < width && (cells[end] ?? null) === null) end += 1;
    const span = end - column === 1 ? null : html` colspan="${end - column}"`;
    const id = value === null ? null : html` id="${cellId(sheet, row, column)}"`;
    marks.push(
      html`<td${id}${span}${typeof value === 'number' ? html` class="number"` : null}>${content(value, tails[column] ?? 0)}</td>`,
    );
    column = end;
  }
  return marks;
}

function content(value: Value, tail: number): Markup | string {
  if (typeof value === 'number') return alignedNumber(value, tail);
  if (value === null) return '';
  if (typeof value === 'boolean') return value ? 'TRUE' : 'FALSE';
  return isError(value) ? html`<strong class="bad" title="${value.message}">${value.error}</strong>` : value;
}
