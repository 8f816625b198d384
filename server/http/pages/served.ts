/** What the pages of the server have beside the printed sheet: a way back, and fields. */
import { html, type Markup, verbatim } from '../../render/html.ts';

/** Fields are ruled lines to write on, as on the pad; on paper they are gone. */
export const SERVED_STYLE = verbatim(`.top { margin-bottom: 0.75rem; }
.pad h3 { margin-bottom: 0.25rem; }
.pad label { font-weight: 600; }
.pad input { font: inherit; font-size: 1.15rem; color: inherit; background: transparent; width: 8rem; padding: 0.1rem 0.2rem; border: 0; border-bottom: 1.5px solid var(--ink); border-radius: 0; }
.pad input:user-invalid { border-bottom-style: double; border-bottom-width: 4px; }
.pad button { font: inherit; color: var(--accent); background: transparent; padding: 0.35rem 0.9rem; border: 1.5px solid var(--accent); border-radius: 0; cursor: pointer; }
@media print { .top, .pad button, .again { display: none; } .pad input { border: 0; } }`);

export function topLine(): Markup {
  return html`<nav class="top"><a href="/">All sheets</a></nav>`;
}
