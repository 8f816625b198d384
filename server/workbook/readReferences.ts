import { suggestion } from '../nearest.ts';
import { serverError } from '../problems.ts';
import { type Reference, fixedReferenceName, looksLikeCell, readReference } from './address.ts';
import type { Path, Report } from './fileProblems.ts';
import type { Sheet } from './model.ts';
import { comparedName } from './prepareFormula.ts';

/** Reads `Kettle!B4` with the sheet's name as the workbook writes it; null when it points nowhere. */
export function readSheetReference(
  text: string,
  sheets: readonly Sheet[],
  where: string,
  path: Path,
  report: Report,
): Reference | null {
  const reference = readReference(text);
  if (reference === null) {
    report(serverError('reference-form', { where, reference: text }), path);
    return null;
  }
  const sheet = sheets.find(({ name }) => comparedName(name) === comparedName(reference.sheet));
  if (sheet === undefined) {
    const nearest = suggestion(
      reference.sheet,
      sheets.map(({ name }) => name),
    );
    report(serverError('reference-sheet', { where, sheet: reference.sheet, nearest }), path);
    return null;
  }
  return { ...reference, sheet: sheet.name };
}

const RANGE_NAME = /^[\p{L}_][\p{L}\p{N}_]*$/u;
const RESERVED = /^(?:true|false)$/i;

/** Reads the range names; a word with points or before a bracket is a function, so neither is a name. */
export function readNames(
  names: Readonly<Record<string, string>>,
  sheets: readonly Sheet[],
  report: Report,
): Record<string, string> {
  const read: Record<string, string> = {};
  const taken = new Map<string, string>();
  for (const [name, text] of Object.entries(names)) {
    const path = ['names', name];
    if (!RANGE_NAME.test(name) || RESERVED.test(name) || looksLikeCell(name)) {
      report(serverError('name-word', { name }), path, 'key');
    }
    refuseTaken(name, `the name ${name}`, taken, path, report);
    const reference = readSheetReference(text, sheets, `the name ${name}`, path, report);
    if (reference !== null) read[name] = fixedReferenceName(reference);
  }
  return read;
}

/** Reports a name that was used before, and notes it otherwise. */
export function refuseTaken(
  name: string,
  what: string,
  taken: Map<string, string>,
  path: Path,
  report: Report,
): void {
  const first = taken.get(comparedName(name));
  if (first !== undefined) report(serverError('name-twice', { second: name, first }), path, 'key');
  taken.set(comparedName(name), what);
}
