/**
 * An evaluation as one standalone page that can be read, printed and signed.
 *
 * The page is a function of the evaluation alone: no clock, no script, nothing loaded from outside.
 */
import type { Evaluation } from '../evaluation.ts';
import { answers } from './answers.ts';
import { attention, matters, verdict } from './attention.ts';
import { checks } from './checks.ts';
import { limitsOfUse, versions } from './closing.ts';
import { documentShell } from './documentShell.ts';
import { stylesheet } from './style/stylesheet.ts';
import { given, otherValues } from './given.ts';
import { html, type Markup } from './html.ts';
import { pageOf, type Page } from './page.ts';
import { sourceSheets } from './source/sourceSheets.ts';
import { stepSection } from './steps/stepSection.ts';
import { titleBlock } from './titleBlock.ts';

/** What a server adds to the page that it shows; the page that is kept and signed has none of it. */
export interface ServedParts {
  /** Above the title block. */
  readonly top?: Markup;
  /** In the place of what is given: the same lines, to be changed where they stand. */
  readonly given?: (page: Page) => Markup | null;
  /** Rules after those of the page. */
  readonly style?: Markup;
}

/** The whole HTML document as text. */
export function renderReport(evaluation: Evaluation, served: ServedParts = {}): string {
  const page = pageOf(evaluation);
  const lines = matters(page);
  const style = html`${stylesheet(evaluation.workbook)} ${served.style ?? null}`;
  const body = html`${served.top ?? null} ${titleBlock(page)}
    <main>
      ${otherValues(page)} ${verdict(page, lines.length)} ${answers(page)} ${(served.given ?? given)(page)}
      ${stepSection(page)} ${checks(page)} ${attention(lines)} ${limitsOfUse()} ${versions(page)}
      ${sourceSheets(page)}
    </main>`;
  return documentShell({ title: evaluation.workbook.title, style, body }).markup;
}
