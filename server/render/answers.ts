/** The answers: every declared output, and the status of the solutions that it rests on. */
import { isError, type OutputValue } from '../evaluation.ts';
import { isOneCell, readReference, type Reference } from '../workbook/address.ts';
import { html, joined, type Markup, type Part } from './html.ts';
import { stepLinks, type Page } from './page.ts';
import { padSection, type Line } from './section.ts';
import { statusCounts } from './statusWords.ts';
import { rangeMarkup, resultMarkup } from './values.ts';

export function answers(page: Page): Markup {
  const lines = Object.entries(page.evaluation.outputs).map(([name, output]) =>
    answerLine(page, name, output),
  );
  return padSection('answers', 'Answers', lines);
}

function answerLine(page: Page, name: string, output: OutputValue): Line {
  const area = readReference(output.cell);
  if (area === null) throw new Error(`invariant: ${output.cell} is an address`);
  const steps = page.calculation.stepsIn(area).map(({ number }) => number);
  const words = isOneCell(area) ? page.cells.labelOf(area) : '';
  const label = words.toLowerCase() === name.toLowerCase() ? '' : words;
  return {
    reference: html`${page.linkTo(area)}${steps.length === 0 ? null : html`<br />${stepLinks(steps)}`}`,
    calculation: html`<p class="name">${name}</p>
      ${label === '' ? null : html`<p>${label}</p>`} ${standing(page, area)}`,
    output: outputMarkup(page, area, output),
  };
}

/** What the answer rests on. */
function standing(page: Page, area: Reference): Part {
  const behind = page.calculation.formulasBehind(area);
  if (behind.length === 0) return html`<p>a typed value</p>`;
  const outcomes = behind.flatMap(({ formula }) => formula.answers.flatMap(({ outcome }) => outcome ?? []));
  if (outcomes.length === 0) return null;
  const reasons = new Set(outcomes.map(({ reason }) => reason).filter((reason) => reason !== ''));
  const why = reasons.size === 0 ? null : html` (${joined([...reasons].slice(0, 3), '; ')})`;
  const count = outcomes.length === 1 ? 'equilibrium' : `${outcomes.length} equilibria`;
  return html`<p>${count} behind it: ${statusCounts(outcomes)}${why}</p>`;
}

function outputMarkup(page: Page, area: Reference, output: OutputValue): Markup {
  const { value } = output;
  if (Array.isArray(value)) return rangeMarkup(page, area, output);
  const single = value as Exclude<typeof value, readonly unknown[]>;
  const message = isError(single) ? html`<p class="message">${single.message}</p>` : null;
  return html`${resultMarkup(single, output)}${message}`;
}
