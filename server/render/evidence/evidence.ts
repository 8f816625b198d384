/** The evidence of one solved equilibrium: how it ended, the figures that show it, and the picture. */
import type { ExtentOutcome } from '../../../functions/equilibrium/extentOutcome.ts';
import { hasAnswer, type Outcome } from '../../../functions/equilibrium/outcome.ts';
import { html, type Markup, type Part } from '../html.ts';
import { numberMarkup } from '../numberText.ts';
import { extentPicture } from '../picture/extentPicture.ts';
import { statusSentence } from '../statusWords.ts';
import { speciesMarkup } from '../typeset/mathml.ts';
import { amountsTable } from './amountsTable.ts';

const RESIDUAL_DIGITS = 2;

/** `id` is unique on the page. */
export function evidence(outcome: Outcome, id: string): Markup {
  const extent = isExtent(outcome) ? outcome : null;
  const figures = [...(extent === null ? [] : extentFigures(extent)), ...solverFigures(outcome)];
  return html`<div class="evidence">
    <p class="status">${statusSentence(outcome)}</p>
    <div class="figures">
      <table class="facts">
        <caption>
          Evidence
        </caption>
        <tbody>
          ${figures.map(
            ([item, value]) =>
              html`<tr>
                <th scope="row">${item}</th>
                <td>${value}</td>
              </tr> `,
          )}
        </tbody>
      </table>
      ${extent !== null && hasAnswer(extent) ? amountsTable(extent) : null}
    </div>
    ${extent === null ? null : extentPicture(extent, id)}
  </div>`;
}

export function isExtent(outcome: Outcome): outcome is ExtentOutcome {
  return outcome.kind === 'extent';
}

type Figure = readonly [item: Part, value: Part];

function extentFigures(outcome: ExtentOutcome): Figure[] {
  const { problem, extent, limits, limiting } = outcome;
  const unit = problem.unit ?? null;
  const limitingSpecies = limiting === null ? undefined : problem.species[limiting];
  const figures: Figure[] = [['ln K', numberMarkup(problem.lnK)]];
  if (!hasAnswer(outcome)) return figures;
  figures.push(
    ['extent', withUnit(extent, unit)],
    ['lowest feasible extent', withUnit(limits[0], unit)],
    ['highest feasible extent', withUnit(limits[1], unit)],
  );
  if (limitingSpecies !== undefined) figures.push(['limiting species', speciesMarkup(limitingSpecies)]);
  if (problem.inert !== 0) figures.push(['inert amount', withUnit(problem.inert, unit)]);
  return figures;
}

function solverFigures(outcome: Outcome): Figure[] {
  const { residual, iterations } = outcome;
  const bound = isExtent(outcome) ? outcome.errorBound : null;
  const figures: Figure[] = [
    [
      'left over, |ln (Q/K)|',
      residual === null ? 'has no number' : numberMarkup(residual, residual === 0 ? null : RESIDUAL_DIGITS),
    ],
  ];
  if (bound !== null) figures.push(['its rounding bound', numberMarkup(bound, RESIDUAL_DIGITS)]);
  figures.push(['iterations', numberMarkup(iterations)]);
  return figures;
}

function withUnit(value: number, unit: string | null): Markup {
  return html`${numberMarkup(value)}${unit === null ? null : ` ${unit}`}`;
}
