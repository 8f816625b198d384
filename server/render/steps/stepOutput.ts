/** The results of a step: one value, an array answer, or the first of a run with the run's range. */
import { isError, type Value } from '../../evaluation.ts';
import { cellCount, cellsShared, readReference } from '../../workbook/address.ts';
import { html, type Markup } from '../html.ts';
import { alignedNumber, tailWidth } from '../numberText.ts';
import type { Page } from '../page.ts';
import { rangeMarkup, resultMarkup } from '../values.ts';
import { cellsOf } from './overlaps.ts';
import type { PlacedFormula } from './placedFormula.ts';
import { hasSingleAnswers, isRun, type Step } from './steps.ts';

/** A run of no more is shown whole. */
const SHORT_RUN = 8;

export function stepOutput(page: Page, step: Step): Markup {
  const [first] = step.formulas;
  const showing = { unit: unitOf(page, first), digits: digitsOf(page, first) };
  if (!hasSingleAnswers(step))
    return html`${rangeMarkup(page, first.fills, showing)}${firstError(page, first)}`;
  if (!isRun(step)) return html`${resultMarkup(valueOf(page, first), showing)}${firstError(page, first)}`;
  if (step.formulas.length <= SHORT_RUN) return rangeMarkup(page, step.fills, showing);
  return html`${resultMarkup(valueOf(page, first), showing)}
    <p class="quiet">the first, ${first.address.split('!').at(-1) ?? ''}</p>
    ${runRange(page, step, showing.digits)}${firstError(page, first)}`;
}

/** From the smallest to the largest of a long run, and how many have no value. */
function runRange(page: Page, step: Step, digits: number | null): Markup {
  const values = step.formulas.map((formula) => valueOf(page, formula));
  const numbers = values.filter((value) => typeof value === 'number').sort((a, b) => a - b);
  const ends = [
    { word: 'smallest', value: numbers[0] },
    { word: 'largest', value: numbers.at(-1) },
  ];
  const tail = tailWidth([...numbers.slice(0, 1), ...numbers.slice(-1)], digits);
  const failed = values.filter(isError).length;
  return html`<table class="list">
      <tbody>
        ${ends.map(({ word, value }) =>
          value === undefined
            ? null
            : html`<tr>
                <th scope="row">${word}</th>
                <td class="number">${alignedNumber(value, tail, digits)}</td>
              </tr>`,
        )}
      </tbody>
    </table>
    ${failed === 0 ? null : html`<p><strong class="bad">no value</strong> in ${failed} of ${values.length}</p>`}`;
}

/** The unit that the function gives where the formula is that function alone, or else the output's label. */
function unitOf(page: Page, { formula, fills }: PlacedFormula): string | null {
  const last = formula.answers.at(-1);
  if (last?.unit && isWholly(formula.formula, last.function)) return last.unit;
  return declaredOver(page, fills)?.unit ?? null;
}

function digitsOf(page: Page, { fills }: PlacedFormula): number | null {
  return declaredOver(page, fills)?.digits ?? null;
}

/** An output that declares every cell of the answer: one that picks a cell says nothing of its neighbours. */
function declaredOver(page: Page, fills: PlacedFormula['fills']) {
  return Object.values(page.evaluation.outputs).find(({ cell }) => {
    const area = readReference(cell);
    return area !== null && cellsShared(area, fills) === cellCount(fills);
  });
}

/** Whether the formula is one call of the function: its bracket closes where the formula ends. */
function isWholly(formula: string, name: string): boolean {
  const call = formula.replace(/^=\s*/, '').trimEnd();
  if (!call.toUpperCase().startsWith(name) || !call.endsWith(')')) return false;
  const inside = call.slice(name.length).replace(/"(?:[^"]|"")*"/g, '');
  let depth = 0;
  for (let index = 0; index < inside.length - 1; index += 1) {
    if (inside[index] === '(') depth += 1;
    if (inside[index] === ')') depth -= 1;
    if (depth === 0 && !/\s/.test(inside[index] ?? '')) return false;
  }
  return depth === 1;
}

function valueOf(page: Page, { fills }: PlacedFormula): Value {
  return page.cells.valueAt(fills.sheet, fills.firstRow, fills.firstColumn);
}

function firstError(page: Page, { fills }: PlacedFormula): Markup | null {
  const error = cellsOf(fills)
    .map(({ firstRow, firstColumn }) => page.cells.valueAt(fills.sheet, firstRow, firstColumn))
    .find(isError);
  return error === undefined ? null : html`<p class="message">${error.message}</p>`;
}
