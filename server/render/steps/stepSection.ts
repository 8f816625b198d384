/** The numbered steps of the calculation. */
import type { Outcome } from '../../../functions/equilibrium/outcome.ts';
import { html, type Markup, type Part } from '../html.ts';
import { solutionKey } from '../evidence/solutionKey.ts';
import { evidence } from '../evidence/evidence.ts';
import { spokenPlace, stepLink, type Page } from '../page.ts';
import { row, section } from '../section.ts';
import { statusCounts } from '../statusWords.ts';
import { equationsOf } from './equations.ts';
import { comesFrom } from './comesFrom.ts';
import { stepOutput } from './stepOutput.ts';
import { isRun, stepId, type Step } from './steps.ts';

const INTRODUCTION =
  'In order of dependence: steps numbered 1 come from typed cells alone, those numbered 2 from steps 1 and typed cells, and so on.';

export function stepSection(page: Page): Markup | null {
  const { steps } = page.calculation;
  if (steps.length === 0) return null;
  const shownIn = new Map<string, string>();
  const articles = steps.map((step) => stepArticle(page, step, shownIn));
  const introduction = html`<p class="quiet">${INTRODUCTION}</p>`;
  const content = [row({ reference: null, calculation: introduction, output: null }), articles];
  return section('steps', 'Steps', content, true);
}

/** `shownIn` remembers in which step a solution was shown, with its equation: once is enough. */
function stepArticle(page: Page, step: Step, shownIn: Map<string, string>): Markup {
  const [first] = step.formulas;
  const outcomes = first.formula.answers.flatMap(({ outcome }) => outcome ?? []);
  const isRepeated = outcomes.length > 0 && outcomes.every((outcome) => shownIn.has(solutionKey(outcome)));
  const label = first.formula.lastCell === null ? page.cells.labelOf(first.fills) : '';
  return html`<article class="row step" id="${stepId(step.number)}">
    <div>
      <h3>${step.number}</h3>
      <p>${page.linkTo(step.fills)}</p>
    </div>
    <div>
      ${label === '' ? null : html`<p class="name">${label}</p>`}
      <p><code>${first.formula.formula}</code></p>
      ${isRun(step) ? runNote(page, step) : null}${comesFrom(page, step)}
      ${isRepeated ? null : equationsOf(page, first)} ${isRun(step) ? runStatuses(step) : null}
      ${outcomes.map((outcome, index) => evidenceOnce(step, outcome, index, shownIn))}
    </div>
    <div>${stepOutput(page, step)}</div>
  </article>`;
}

function runNote(page: Page, step: Step): Markup {
  const count = step.formulas.length;
  return html`<p class="quiet">
    The same formula in each of ${count} places, ${spokenPlace(page, step.fills)}. The first is worked here.
  </p>`;
}

function runStatuses(step: Step): Part {
  const outcomes = step.formulas.flatMap(({ formula }) =>
    formula.answers.flatMap(({ outcome }) => outcome ?? []),
  );
  return outcomes.length === 0
    ? null
    : html`<p>All ${step.formulas.length} places: ${statusCounts(outcomes)}</p>`;
}

function evidenceOnce(step: Step, outcome: Outcome, index: number, shownIn: Map<string, string>): Markup {
  const key = solutionKey(outcome);
  const shown = shownIn.get(key);
  if (shown !== undefined && shown !== step.number) {
    return html`<p>
      <strong>${outcome.status}</strong>: the solution of ${stepLink(shown)}, where its evidence stands.
    </p>`;
  }
  shownIn.set(key, step.number);
  return evidence(outcome, `${stepId(step.number)}-${index + 1}`);
}
