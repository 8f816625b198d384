import { documentShell } from '../../render/documentShell.ts';
import { html, type Markup, type Part, verbatim } from '../../render/html.ts';
import { COLUMNS } from '../../render/style/columns.ts';
import { INK } from '../../render/style/ink.ts';
import { NARROW } from '../../render/style/narrow.ts';
import { PRINT } from '../../render/style/print.ts';
import { SHEET } from '../../render/style/sheet.ts';
import { SERVED_STYLE } from './served.ts';

const STYLE = verbatim([INK, SHEET, COLUMNS, NARROW, PRINT, SERVED_STYLE.markup].join('\n'));

export interface Document {
  readonly title: string;
  readonly about: Part;
  readonly top: Markup | null;
  readonly content: Part;
}

/** A page of the server that is no sheet, on the same pad. */
export function documentOf({ title, about, top, content }: Document): string {
  const body = html`${top}
    <header class="title-block">
      <div class="job">
        <h1>${title}</h1>
        <p class="about">${about}</p>
      </div>
    </header>
    <main>${content}</main>`;
  return documentShell({ title, style: STYLE, body }).markup;
}
