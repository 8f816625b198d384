/** What a step comes from: other steps by number, typed cells by address with the author's words. */
import { isOneCell, type Reference } from '../../workbook/address.ts';
import { html, joined, type Markup, type Part } from '../html.ts';
import { stepLink, type Page } from '../page.ts';
import { valueMarkup } from '../values.ts';
import type { Step } from './steps.ts';

/** Of a longer table the first words tell which it is. */
const MOST_WORDS = 4;
/** Headings by which tables of amounts and of conditions are recognised; they tell no table apart. */
const HEADINGS = ['species', 'quantity'];

export function comesFrom(page: Page, step: Step): Markup | null {
  const byStep = new Map<string, Reference[]>();
  for (const { reference, steps } of step.comesFrom) {
    for (const number of steps) byStep.set(number, [...(byStep.get(number) ?? []), reference]);
  }
  const parts = [
    ...[...byStep].map(([number, references]) => stepSource(page, step, number, references)),
    ...step.comesFrom.filter(({ hasTyped }) => hasTyped).map(({ reference }) => typedSource(page, reference)),
  ];
  return parts.length === 0 ? null : html`<p class="comes-from">comes from ${joined(parts, '; ')}</p>`;
}

function stepSource(page: Page, step: Step, number: string, references: readonly Reference[]): Markup {
  const link = number === step.number ? 'this step' : stepLink(number);
  return html`${link} (${joined(references.map(page.linkTo), ', ')})`;
}

function typedSource(page: Page, reference: Reference): Part {
  return [
    page.linkTo(reference),
    isOneCell(reference) ? typedCell(page, reference) : typedRange(page, reference),
  ];
}

function typedCell(page: Page, cell: Reference): Markup {
  const value = page.cells.valueAt(cell.sheet, cell.firstRow, cell.firstColumn);
  const label = typeof value === 'string' ? '' : page.cells.labelOf(cell);
  return html`${label === '' ? null : ` ${label}`} ${valueMarkup(value)}`;
}

/** The words of its first column, or of its first row where it is one row. */
function typedRange(page: Page, area: Reference): Markup | null {
  const values = page.cells.valuesIn(area);
  const line = values.length === 1 ? (values[0] ?? []) : values.map(([first]) => first ?? null);
  const words = line.filter((value) => typeof value === 'string').filter((word) => !HEADINGS.includes(word));
  if (words.length === 0) return null;
  const more = words.length > MOST_WORDS ? [`${words.length - MOST_WORDS} more`] : [];
  return html` (${[...words.slice(0, MOST_WORDS), ...more].join(', ')})`;
}
