/** The equilibria that the cells of a workbook solved, and how each ended. */
import type { Status } from '../../functions/equilibrium/outcome.ts';
import { cellsFilled, type Evaluation } from '../evaluation.ts';
import { cellsShared, readReference } from '../workbook/address.ts';

export interface Equilibrium {
  readonly cell: string;
  readonly function: string;
  readonly status: Status;
  /** Empty when plainly settled. */
  readonly reason: string;
}

/** Of a longer list of cells the first tell where to look. */
const MOST_CELLS = 6;

/** Every solved call, in the order of the evaluation. */
export function equilibria({ formulas }: Evaluation): Equilibrium[] {
  return Object.entries(formulas).flatMap(([cell, { answers }]) =>
    answers.flatMap(({ function: name, outcome }) =>
      outcome === null ? [] : [{ cell, function: name, status: outcome.status, reason: outcome.reason }],
    ),
  );
}

/** The endings, each once, of what is solved in the cells at this address or fills into them. */
export function endingsAt(address: string, evaluation: Evaluation): string[] {
  const area = readReference(address)!;
  const endings = equilibria(evaluation)
    .filter(({ cell }) => cellsShared(area, cellsFilled(cell, evaluation.formulas[cell]!)) > 0)
    .filter(({ status }) => status !== 'settled');
  return [...new Set(endings.map(ending))];
}

/** `Bed!B3: EXTENT.SOLVE exhausted (A(s) ran out)`, the cells with one ending on one line. */
export function endingLines(solved: readonly Equilibrium[]): string[] {
  const cells = new Map<string, string[]>();
  for (const each of solved) {
    const line = `${each.function} ${ending(each)}`;
    cells.set(line, [...(cells.get(line) ?? []), each.cell]);
  }
  return [...cells].map(([line, found]) => {
    const places = [...new Set(found)];
    const more = places.length > MOST_CELLS ? ` and ${places.length - MOST_CELLS} more` : '';
    return `${places.slice(0, MOST_CELLS).join(', ')}${more}: ${line}`;
  });
}

function ending({ status, reason }: Equilibrium): string {
  return reason === '' ? status : `${status} (${reason})`;
}
