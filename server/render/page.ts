/** What every part of the report reads: the evaluation, its steps, and how places are named. */
import type { Evaluation } from '../evaluation.ts';
import { areaName, cellName, isOneCell, referenceName, type Reference } from '../workbook/address.ts';
import { html, joined, type Markup, type Part } from './html.ts';
import { sheetReader, type SheetReader } from './sheetReader.ts';
import { calculationOf, stepId, type Calculation } from './steps/steps.ts';

export interface Page {
  readonly evaluation: Evaluation;
  readonly calculation: Calculation;
  readonly cells: SheetReader;
  /** `E3` where the workbook has one sheet, `Kettle!E3` where it has several. */
  readonly placeOf: (reference: Reference) => string;
  /** The place, leading to the source sheet. */
  readonly linkTo: (reference: Reference) => Markup;
}

export function pageOf(evaluation: Evaluation): Page {
  const sheetNames = Object.keys(evaluation.sheets);
  const placeOf = sheetNames.length > 1 ? referenceName : areaName;
  return {
    evaluation,
    calculation: calculationOf(evaluation),
    cells: sheetReader(evaluation),
    placeOf,
    linkTo: (reference) => {
      const id = cellId(sheetNames.indexOf(reference.sheet), reference.firstRow, reference.firstColumn);
      return html`<a class="place" href="#${id}">${breakable(placeOf(reference))}</a>`;
    },
  };
}

/** `cell-1-E3`: the sheet by its position, so that its name needs no escaping. */
export function cellId(sheet: number, row: number, column: number): string {
  return `cell-${sheet + 1}-${cellName(row, column)}`;
}

/** A long place breaks after the sheet's name and after the colon rather than within an address. */
function breakable(place: string): Part {
  return joined(place.split(/(?<=[!:])/), html`<wbr />`);
}

/** `step 2.1`, leading there. */
export function stepLink(number: string): Markup {
  return html`<a href="#${stepId(number)}">step&#160;${number}</a>`;
}

/** `step 2.1`, or `steps 2.1, 2.3`. */
export function stepLinks(numbers: readonly string[]): Part {
  const [only, ...more] = numbers;
  if (only === undefined) return null;
  if (more.length === 0) return stepLink(only);
  const links = numbers.map((number) => html`<a href="#${stepId(number)}">${number}</a>`);
  return html`steps ${joined(links, ', ')}`;
}

/** `E3`, or `E3 to E202` for a range read aloud. */
export function spokenPlace(page: Page, area: Reference): string {
  return isOneCell(area) ? page.placeOf(area) : page.placeOf(area).replace(':', ' to ');
}
