/** What needs attention: cells without a value, solutions that did not settle, checks not passed. */
import type { Outcome } from '../../functions/equilibrium/outcome.ts';
import { readReference } from '../workbook/address.ts';
import { html, joined, type Markup, type Part } from './html.ts';
import { stepLinks, type Page } from './page.ts';
import { padSection, type Line } from './section.ts';
import { isSettled, statusSentence } from './statusWords.ts';
import type { PlacedFormula } from './steps/placedFormula.ts';

/** Of a longer list of cells the first tell where to look. */
const MOST_CELLS = 6;

/** One line for each matter, in the order of the page. */
export function matters(page: Page): Line[] {
  return [...errorLines(page), ...unsettledLines(page), ...checkLines(page)];
}

export function attention(lines: readonly Line[]): Markup | null {
  return lines.length === 0 ? null : padSection('attention', 'Needs attention', lines);
}

/** The state of the whole sheet in one sentence, to stand at its head. */
export function verdict({ evaluation: { checks } }: Page, count: number): Markup {
  const passed = checks.filter((check) => check.passed).length;
  const ofChecks =
    checks.length === 0
      ? 'The workbook has no checks of its own'
      : `${passed} of ${checks.length} checks passed`;
  const needs =
    count === 0
      ? 'nothing needs attention'
      : html`<strong class="bad"
          ><a href="#attention"
            >${count} ${count === 1 ? 'matter needs' : 'matters need'} attention</a
          ></strong
        >`;
  return html`<p class="verdict">${ofChecks}; ${needs}.</p>`;
}

function errorLines(page: Page): Line[] {
  return page.evaluation.problems.map(({ cell, code, message }) => {
    const place = readReference(cell);
    const steps = place === null ? [] : page.calculation.stepsIn(place);
    return {
      reference: html`${place === null ? cell : page.linkTo(place)}<br />${stepLinks(steps.map(({ number }) => number))}`,
      calculation: html`<p>${message}</p>`,
      output: html`<strong class="bad">no value</strong>
        <p class="code">${code}</p>`,
    };
  });
}

/** One line for each way in which solutions ended, wherever in the workbook. */
function unsettledLines(page: Page): Line[] {
  const endings = new Map<string, { outcome: Outcome; formulas: Set<PlacedFormula> }>();
  for (const placed of page.calculation.steps.flatMap(({ formulas }) => formulas)) {
    for (const { outcome } of placed.formula.answers) {
      if (outcome === null || isSettled(outcome.status)) continue;
      const key = `${outcome.status} ${outcome.reason}`;
      const ending = endings.get(key) ?? { outcome, formulas: new Set() };
      endings.set(key, { outcome, formulas: ending.formulas.add(placed) });
    }
  }
  return [...endings.values()].map(({ outcome, formulas }) => ({
    reference: cellList(page, [...formulas]),
    calculation: html`<p>${statusSentence(outcome)}</p>`,
    output: html`<strong class="bad">${outcome.status}</strong>`,
  }));
}

function cellList(page: Page, formulas: readonly PlacedFormula[]): Part {
  const more = formulas.length > MOST_CELLS ? [`${formulas.length - MOST_CELLS} more`] : [];
  const steps = new Set(formulas.flatMap(({ fills }) => page.calculation.stepsIn(fills)));
  return [
    joined([...formulas.slice(0, MOST_CELLS).map(({ fills }) => page.linkTo(fills)), ...more], ', '),
    html`<br />${stepLinks([...steps].map(({ number }) => number))}`,
  ];
}

function checkLines({ evaluation }: Page): Line[] {
  return evaluation.checks.flatMap(({ passed, source }, index) =>
    passed
      ? []
      : [
          {
            reference: html`<a href="#check-${index + 1}">check ${index + 1}</a>`,
            calculation: html`<p>What is found lies outside what is expected. Source: ${source}</p>`,
            output: html`<strong class="bad">not passed</strong>`,
          },
        ],
  );
}
