/**
 * The words of an amounts table: which species stands on which line, in which unit.
 *
 * Ten thousand tables of a sheet differ in their numbers only. Their words are read once and
 * remembered, and with them all that follows from words alone.
 */
import { readUnit } from '../../chemistry/units/readUnit.ts';
import type { Unit } from '../../chemistry/units/unit.ts';
import { inputError, withPlace } from '../../errors.ts';
import type { CellScalar } from '../entry.ts';
import { describe } from '../parameters/describe.ts';
import { coverageFactorUnder } from './heading.ts';
import { isHeadingWord } from './lines.ts';

export interface FormLine {
  /** Place in the table, counted from 0, heading and blank lines included. */
  readonly index: number;
  /** As written; empty in a bare row or column. */
  readonly species: string;
  readonly unit: Unit | null;
}

export interface TableForm {
  readonly isLabelled: boolean;
  readonly lies: 'down' | 'across';
  /** Number of lines, heading and blank ones included. */
  readonly length: number;
  readonly hasHeading: boolean;
  /** What the uncertainties are to be divided by: the k of an expanded uncertainty, otherwise 1. */
  readonly coverageFactor: number;
  /** The lines that hold an amount. */
  readonly lines: readonly FormLine[];
}

/** Forms remembered at a time; when they are full they are forgotten, which costs time and changes nothing. */
const CAPACITY = 500;
const labelledForms = new Map<string, TableForm>();
const bareForms = new Map<string, TableForm>();

/** The form that was asked for last; most often the next table has the same words. */
let latest: { readonly form: TableForm; readonly words: readonly (CellScalar | undefined)[] } | undefined;

type Line = readonly CellScalar[];

/** Where a line stands, for a message: `amounts row 3 (NH3)`. */
export function linePlace(
  { lies }: Pick<TableForm, 'lies'>,
  { index, species }: Omit<FormLine, 'unit'>,
): string {
  const place = `amounts ${lies === 'down' ? 'row' : 'column'} ${index + 1}`;
  return species === '' ? place : `${place} (${species})`;
}

/**
 * The form of a labelled table from its lines.
 *
 * Errors: `amounts-species`, `amounts-unit`, those of the heading, `unit-unknown`; each names the line.
 */
export function labelledForm(lines: readonly Line[], lies: 'down' | 'across'): TableForm {
  if (latest !== undefined && isWordedAs(latest, lines, lies)) return latest.form;
  const words = wordsOf(lines);
  const form = remembered(labelledForms, JSON.stringify([lies, words]), () => readForm(lines, lies));
  latest = { form, words };
  return form;
}

/** All that a form is read from: two words of each line, and the rest of the heading. */
function wordsOf(lines: readonly Line[]): (CellScalar | undefined)[] {
  const words = lines.flatMap((line) => [line[0], line[2]]);
  if (isHeadingWord(lines[0]![0]!, 'species')) words.push(lines[0]![1], lines[0]![3]);
  return words;
}

/** Whether the lines have the words that a form was read from. */
function isWordedAs(
  { form, words }: NonNullable<typeof latest>,
  lines: readonly Line[],
  lies: TableForm['lies'],
): boolean {
  if (form.lies !== lies || form.length !== lines.length) return false;
  for (let i = 0; i < lines.length; i++) {
    if (lines[i]![0] !== words[2 * i] || lines[i]![2] !== words[2 * i + 1]) return false;
  }
  return !form.hasHeading || (lines[0]![1] === words.at(-2) && lines[0]![3] === words.at(-1));
}

/** The form of a bare row or column of numbers. */
export function bareForm(length: number, lies: 'down' | 'across'): TableForm {
  return remembered(bareForms, `${lies} ${length}`, () => {
    const lines = Array.from({ length }, (_, index) => ({ index, species: '', unit: null }));
    return { isLabelled: false, lies, length, hasHeading: false, coverageFactor: 1, lines };
  });
}

export function isBlank(line: Line): boolean {
  return line.every((cell) => cell === null || cell === '');
}

function remembered(forms: Map<string, TableForm>, key: string, read: () => TableForm): TableForm {
  const known = forms.get(key);
  if (known !== undefined) return known;
  if (forms.size >= CAPACITY) forms.clear();
  const form = read();
  forms.set(key, form);
  return form;
}

function readForm(lines: readonly Line[], lies: 'down' | 'across'): TableForm {
  const hasHeading = isHeadingWord(lines[0]![0]!, 'species');
  const formLines: FormLine[] = [];
  lines.forEach((line, index) => {
    if ((hasHeading && index === 0) || isUnlabelled(line)) return;
    const species = readLabel(line[0]!, linePlace({ lies }, { index, species: '' }));
    const place = linePlace({ lies }, { index, species });
    formLines.push({ index, species, unit: readLineUnit(line[2] ?? null, place) });
  });
  const coverageFactor = hasHeading ? coverageFactorUnder(lines[0]!, 'amounts') : 1;
  return { isLabelled: true, lies, length: lines.length, hasHeading, coverageFactor, lines: formLines };
}

function isUnlabelled(line: Line): boolean {
  return (
    (line[0] === null || line[0] === '') && (line[2] === null || line[2] === undefined || line[2] === '')
  );
}

function readLabel(cell: CellScalar, place: string): string {
  if (typeof cell === 'string' && cell.trim() !== '') return cell.trim();
  throw inputError('amounts-species', { place, given: describe(cell) });
}

function readLineUnit(cell: CellScalar, place: string): Unit | null {
  if (cell === null || cell === '') return null;
  if (typeof cell === 'string') {
    return withPlace(
      () => place,
      () => readUnit(cell),
    );
  }
  throw inputError('amounts-unit', { place, given: describe(cell) });
}
