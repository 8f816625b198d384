/** The amounts before and after, species by species. */
import type { ExtentOutcome } from '../../../functions/equilibrium/extentOutcome.ts';
import { html, type Markup } from '../html.ts';
import { alignedNumber, numberText, tailWidth } from '../numberText.ts';
import { speciesMarkup } from '../typeset/mathml.ts';

const DIGITS_OF_TRACE = 4;

export function amountsTable(outcome: ExtentOutcome): Markup {
  const { problem, extent, amounts, lnAmounts } = outcome;
  const { species, feed } = problem;
  const changes = problem.stoichiometry.map((coefficient) => coefficient * extent);
  const columns = [feed, changes, amounts].map((values) => ({ values, tail: tailWidth(values) }));
  return html`<table class="amounts">
    <caption>
      Amounts${problem.unit ? ` in ${problem.unit}` : null}
    </caption>
    <thead>
      <tr>
        <th scope="col">species</th>
        <th scope="col">fed</th>
        <th scope="col">change</th>
        <th scope="col">at the end</th>
      </tr>
    </thead>
    <tbody>
      ${species.map(
        (name, index) =>
          html`<tr>
            <th scope="row">${speciesMarkup(name)}</th>
            ${columns.map(({ values, tail }) => {
              const value = values[index] ?? 0;
              const isTrace = values === amounts && value === 0;
              const trace = isTrace ? traceMarkup(lnAmounts[index] ?? null) : null;
              return html`<td class="number">${trace ?? alignedNumber(value, tail)}</td>`;
            })}
          </tr> `,
      )}
    </tbody>
  </table>`;
}

/** An amount too small to be held as a number, from its logarithm; null where it is truly 0. */
function traceMarkup(lnAmount: number | null): Markup | null {
  if (lnAmount === null || !Number.isFinite(lnAmount)) return null;
  const power = Math.floor(lnAmount / Math.LN10);
  const mantissa = Math.exp(lnAmount - power * Math.LN10);
  return html`<span title="natural logarithm ${lnAmount}"
    >${numberText(mantissa, DIGITS_OF_TRACE)}&#215;10<sup>${String(power).replace('-', '\u2212')}</sup></span
  >`;
}
