/** The title block: job, sheet, revision, and lines for those who prepare and check it to sign. */
import { html, type Markup } from './html.ts';
import type { Page } from './page.ts';

/** As many figures of the digest as tell two revisions of a workbook apart at sight. */
const REVISION_LENGTH = 12;

export function titleBlock({ evaluation: { workbook, sheets } }: Page): Markup {
  const names = Object.keys(sheets).join(', ');
  return html`<header class="title-block">
    <div class="job">
      <p class="field">Job</p>
      <h1>${workbook.title}</h1>
      <p class="about">${workbook.about}</p>
    </div>
    <dl>
      <div>
        <dt class="field">Sheet</dt>
        <dd>${workbook.file}${names === '' ? null : html` <span class="quiet">(${names})</span>`}</dd>
      </div>
      <div>
        <dt class="field">Revision</dt>
        <dd>
          <data value="${workbook.sha256}" title="${workbook.sha256}">${revisionOf(workbook.sha256)}</data>
        </dd>
      </div>
      <div class="signed">
        <dt class="field">Prepared</dt>
        <dd><span class="field">name, date</span></dd>
      </div>
      <div class="signed">
        <dt class="field">Checked</dt>
        <dd><span class="field">name, date</span></dd>
      </div>
    </dl>
  </header>`;
}

/** The revision of a workbook is the beginning of its digest: it changes with any byte of the file. */
export function revisionOf(sha256: string): string {
  return sha256.slice(0, REVISION_LENGTH);
}
