import { html } from '../../render/html.ts';
import { row } from '../../render/section.ts';
import type { ProblemDetails } from '../problemDetails.ts';
import { documentOf } from './document.ts';
import { topLine } from './served.ts';

/** What went wrong with a request, for a person; the way back keeps what was typed. */
export function problemPage({ detail, code }: ProblemDetails): string {
  return documentOf({
    title: 'Not answered',
    about: 'Go back to change what was asked.',
    top: topLine(),
    content: row({
      reference: html`<span class="code">${code}</span>`,
      calculation: html`<p>${detail}</p>`,
      output: null,
    }),
  });
}
