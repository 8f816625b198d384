/**
 * Reads an amounts table: lines `species | amount | unit | standard uncertainty`, the last two
 * optional, lying down or across; or one bare row or column of numbers in the order of an equation.
 */
import { inputError } from '../../errors.ts';
import type { CellScalar, CellTable, CellValue, Parameter } from '../entry.ts';
import { describe } from '../parameters/describe.ts';
import { tableLines, WIDEST_LINE } from './lines.ts';
import { bareForm, isBlank, labelledForm, linePlace, type TableForm } from './tableForm.ts';

export interface AmountsTable {
  readonly form: TableForm;
  /** One for each line of the form, in the unit of the line. */
  readonly amounts: readonly number[];
  /** Standard uncertainties in the same units, as differences; null where none is given. */
  readonly uncertainties: readonly (number | null)[];
}

/** An amounts table as an argument. */
export function amounts(summary: string): Parameter<AmountsTable> {
  return { summary, isOptional: false, read: readAmounts };
}

/**
 * An answer that lines up with the table: one cell for each of its lines, blank where the line is
 * blank, `heading` where it has its heading. `cell` is handed the position among the form's lines.
 */
export function alignedWith(
  { lies, length, hasHeading, lines }: TableForm,
  heading: string,
  cell: (position: number) => CellScalar,
): CellTable {
  const cells: CellScalar[] = new Array<CellScalar>(length).fill(null);
  if (hasHeading) cells[0] = heading;
  lines.forEach(({ index }, position) => (cells[index] = cell(position)));
  return lies === 'down' ? cells.map((value) => [value]) : [cells];
}

/**
 * The amounts that a range states.
 *
 * Errors: `amounts-table`, `amounts-blank`, `amounts-number`, `amounts-uncertainty`, and those of
 * the form; each names the line.
 */
function readAmounts(given: CellValue, argument: string): AmountsTable {
  if (!Array.isArray(given)) throw wrongTable(given, argument);
  const table = given as CellTable;
  if (table.length === 1 || table[0]!.length === 1) return readBare(table);
  const { lies, lines } = tableLines(table);
  if (lines[0]!.length > WIDEST_LINE) throw wrongTable(given, argument);
  const form = labelledForm(lines, lies);
  checkUnlabelled(form, lines);
  const count = form.lines.length;
  const values = new Array<number>(count);
  const uncertainties = new Array<number | null>(count);
  for (let i = 0; i < count; i++) {
    const line = lines[form.lines[i]!.index]!;
    values[i] = readAmount(line[1]!, form, i);
    uncertainties[i] = readUncertainty(line[3], form, i);
  }
  return { form, amounts: values, uncertainties };
}

function readBare(table: CellTable): AmountsTable {
  const lies = table.length === 1 ? 'across' : 'down';
  const cells = lies === 'across' ? table[0]! : table.map((row) => row[0]!);
  const form = bareForm(cells.length, lies);
  const values = cells.map((cell, i) => readAmount(cell, form, i));
  return { form, amounts: values, uncertainties: cells.map(() => null) };
}

/** A line without a species must be blank altogether. */
function checkUnlabelled(form: TableForm, lines: CellTable): void {
  if (form.lines.length + (form.hasHeading ? 1 : 0) === lines.length) return;
  lines.forEach((line, index) => {
    if (line[0] !== null && line[0] !== '') return;
    if (isBlank(line)) return;
    throw inputError('amounts-species', { place: linePlace(form, { index, species: '' }), given: 'nothing' });
  });
}

function readAmount(cell: CellScalar, form: TableForm, position: number): number {
  if (typeof cell === 'number' && Number.isFinite(cell)) return cell;
  const place = linePlace(form, form.lines[position]!);
  if (cell === null || cell === '') throw inputError('amounts-blank', { place });
  throw inputError('amounts-number', { place, given: describe(cell) });
}

function readUncertainty(cell: CellScalar | undefined, form: TableForm, position: number): number | null {
  if (cell === null || cell === undefined || cell === '') return null;
  if (typeof cell === 'number' && cell >= 0 && Number.isFinite(cell)) return cell / form.coverageFactor;
  const place = linePlace(form, form.lines[position]!);
  throw inputError('amounts-uncertainty', { place, given: describe(cell) });
}

function wrongTable(given: CellValue, argument: string) {
  return inputError('amounts-table', { argument, given: describe(given) });
}
