/** The formulas of a sheet, each as its author wrote it; filled-down copies stand once, with their range. */
import { areaName } from '../../workbook/address.ts';
import { html, type Markup } from '../html.ts';
import { stepLink, type Page } from '../page.ts';
import { isRun, type Step } from '../steps/steps.ts';

export function formulaTable(page: Page, sheet: string): Markup | null {
  const steps = page.calculation.steps
    .filter(({ fills }) => fills.sheet === sheet)
    .sort((a, b) => a.fills.firstRow - b.fills.firstRow || a.fills.firstColumn - b.fills.firstColumn);
  if (steps.length === 0) return null;
  return html`<table class="formulas">
    <caption>
      Sheet ${sheet}, formulas
    </caption>
    <thead>
      <tr>
        <th scope="col">cells</th>
        <th scope="col">formula</th>
        <th scope="col">worked in</th>
      </tr>
    </thead>
    <tbody>
      ${steps.map(
        (step) =>
          html`<tr>
            <th scope="row">${areaName(step.fills)}</th>
            <td><code>${step.formulas[0].formula.formula}</code>${kind(step)}</td>
            <td>${stepLink(step.number)}</td>
          </tr> `,
      )}
    </tbody>
  </table>`;
}

function kind(step: Step): Markup | null {
  const [first] = step.formulas;
  if (isRun(step)) return html` <span class="quiet">the first of ${step.formulas.length} alike</span>`;
  return first.formula.lastCell === null ? null : html` <span class="quiet">one array answer</span>`;
}
