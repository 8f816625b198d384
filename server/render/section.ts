/** The ruled columns of the calculation pad, which every section but the source sheet keeps to. */
import { html, type Markup, type Part } from './html.ts';

export interface Line {
  readonly reference: Part;
  readonly calculation: Part;
  readonly output: Part;
}

/** A section whose lines are a table: Reference, Calculation, Output. */
export function padSection(id: string, heading: string, lines: readonly Line[]): Markup {
  const table = html`<table class="pad">
    <caption class="for-reading-aloud">
      ${heading}
    </caption>
    <colgroup>
      <col class="reference" />
      <col />
      <col class="output" />
    </colgroup>
    <thead class="for-reading-aloud">
      <tr>
        <th scope="col">Reference</th>
        <th scope="col">Calculation</th>
        <th scope="col">Output</th>
      </tr>
    </thead>
    <tbody>
      ${lines.map(
        ({ reference, calculation, output }) =>
          html`<tr>
            <td>${reference}</td>
            <td>${calculation}</td>
            <td>${output}</td>
          </tr> `,
      )}
    </tbody>
  </table>`;
  const hasOutputs = lines.some(({ output }) => output !== null);
  return section(id, heading, lines.length === 0 ? null : table, hasOutputs);
}

/** A section with its heading in the column for calculation; the others are named where there are outputs. */
export function section(id: string, heading: string, content: Part, hasOutputs = false): Markup {
  return html`<section id="${id}" aria-labelledby="${id}-heading">
    <div class="row heading">
      <p aria-hidden="true">${hasOutputs ? 'Reference' : null}</p>
      <h2 id="${id}-heading">${heading}</h2>
      <p aria-hidden="true">${hasOutputs ? 'Output' : null}</p>
    </div>
    ${content}
  </section>`;
}

/** One line of the pad outside a table. */
export function row({ reference, calculation, output }: Line): Markup {
  return html`<div class="row">
    <div>${reference}</div>
    <div>${calculation}</div>
    <div>${output}</div>
  </div>`;
}
