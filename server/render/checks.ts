/** The workbook's own checks: expected, found, how far they may differ, the source, and the result in words. */
import type { CheckResult, Value } from '../evaluation.ts';
import { html, joined, type Markup, type Part } from './html.ts';
import { allDigits, foundDigits, toleranceText } from './checkNumbers.ts';
import type { Page } from './page.ts';
import { padSection, type Line } from './section.ts';
import { valueMarkup } from './values.ts';

/** Of a found range the first values tell which it is. */
const MOST_FOUND = 6;

export function checks({ evaluation }: Page): Markup | null {
  if (evaluation.checks.length === 0) return null;
  return padSection('checks', 'Checks', evaluation.checks.map(checkLine));
}

function checkLine(check: CheckResult, index: number): Line {
  const rows = Object.entries(check.expected).map(
    ([name, expected]) =>
      html`<tr>
        <th scope="row">${name}</th>
        <td>${anyMarkup(expected)}</td>
        <td>${foundMarkup(check, name)}</td>
        <td>${withinMarkup(check.within[name])}</td>
      </tr> `,
  );
  return {
    reference: html`<span id="check-${index + 1}">check ${index + 1}</span>`,
    calculation: html`${givenMarkup(check)}
      <table class="facts">
        <thead>
          <tr>
            <th scope="col">output</th>
            <th scope="col">expected</th>
            <th scope="col">found</th>
            <th scope="col">within</th>
          </tr>
        </thead>
        <tbody>
          ${rows}
        </tbody>
      </table>
      <p class="quiet">Source: ${check.source}</p>`,
    output: html`<p class="result">
      ${check.passed ? 'passed' : html`<strong class="bad">not passed</strong>`}
    </p>`,
  };
}

function givenMarkup({ given }: CheckResult): Part {
  const changes = Object.entries(given).map(([name, value]) => html`${name} ${valueMarkup(value)}`);
  return changes.length === 0
    ? html`<p>With the workbook’s own values.</p>`
    : html`<p>With ${joined(changes, ', ')}, the rest the workbook’s own.</p>`;
}

function withinMarkup(within: CheckResult['within'][string] | undefined): string {
  return within ? toleranceText(within) : 'exactly';
}

function foundMarkup({ found, within, passed }: CheckResult, name: string): Part {
  const value = found[name];
  if (value === undefined) return html`<strong class="bad">no value</strong>`;
  const markup = (each: Value) =>
    valueMarkup(each, typeof each === 'number' ? foundDigits(each, within[name] ?? null, passed) : null);
  if (!Array.isArray(value)) return markup(value as Value);
  const values = (value as readonly (readonly Value[])[]).flat();
  const more = values.length > MOST_FOUND ? [`${values.length - MOST_FOUND} more`] : [];
  return joined([...values.slice(0, MOST_FOUND).map(markup), ...more], ', ');
}

/** Expected values are as the author wrote them: a value, a list, or a code or status under its name. */
function anyMarkup(expected: unknown): Part {
  if (typeof expected === 'number') return valueMarkup(expected, allDigits(expected));
  if (typeof expected === 'boolean') return valueMarkup(expected);
  if (typeof expected === 'string') return expected;
  if (Array.isArray(expected)) return joined(expected.flat().slice(0, MOST_FOUND).map(anyMarkup), ', ');
  if (typeof expected !== 'object' || expected === null) return 'blank';
  return joined(
    Object.entries(expected).map(([name, value]) => html`${name} ${anyMarkup(value)}`),
    ', ',
  );
}
