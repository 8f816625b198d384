/**
 * Functions of the analyst's own: a JavaScript module whose exports were made by `defineFunction`.
 *
 * A workbook can never name such a file; a person does, because the module runs with all the rights of
 * the program.
 */
import { createHash } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { register } from 'node:module';
import { resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { catalogue } from '../functions/catalogue.ts';
import type { CellFunction } from '../functions/cells/entry.ts';
import { inputError } from '../functions/errors.ts';
import type { OwnFunctions } from './engine/ownFunctions.ts';
import { systemReason } from './files/reasons.ts';
import { serverError } from './problems.ts';

/**
 * Errors: `file-unreadable`, `own-functions-file`, `own-functions-none`, `own-functions-entry`, and
 * `function-name-taken` for a name that the catalogue has; the engine refuses its own names itself.
 */
export async function loadOwnFunctions(file: string): Promise<OwnFunctions> {
  const sha256 = await digestOf(file);
  const exported = Object.entries(await importedFrom(file)).filter(([, value]) => isMeantAsFunction(value));
  if (exported.length === 0) throw serverError('own-functions-none', { file });
  for (const [name, entry] of exported) {
    const problem = whatIsWrong(entry as object);
    if (problem !== null) throw serverError('own-functions-entry', { export: name, file, problem });
  }
  const functions = [...new Set(exported.map(([, entry]) => entry as CellFunction))];
  refuseTaken(functions);
  return { file, sha256, functions };
}

async function digestOf(file: string): Promise<string> {
  try {
    return createHash('sha256')
      .update(await readFile(file))
      .digest('hex');
  } catch (thrown) {
    throw serverError('file-unreadable', { file, reason: systemReason(thrown) });
  }
}

async function importedFrom(file: string): Promise<object> {
  try {
    leadToThisPackage();
    return (await import(pathToFileURL(resolve(file)).href)) as object;
  } catch (thrown) {
    throw serverError('own-functions-file', { file, reason: (thrown as Error).message });
  }
}

/** Lets the module import `evenkeel` from whatever folder it lies in, and get the version that runs it. */
const RESOLVER = `
let here;
export const initialize = (url) => { here = url; };
export const resolve = (name, context, next) =>
  next(name, /^evenkeel(\\/|$)/.test(name) ? { ...context, parentURL: here } : context);
`;
let isLeading = false;

function leadToThisPackage(): void {
  if (isLeading) return;
  register(`data:text/javascript,${encodeURIComponent(RESOLVER)}`, { data: import.meta.url });
  isLeading = true;
}

function isMeantAsFunction(value: unknown): boolean {
  return typeof value === 'object' && value !== null && 'run' in value && 'name' in value;
}

const NAME = /^[A-Z][A-Z0-9]*(?:\.[A-Z0-9]+)+$/;

/** What is missing or wrong, in words; the module may be written in plain JavaScript, unchecked. */
function whatIsWrong(entry: Partial<Record<keyof CellFunction, unknown>>): string | null {
  const { name, summary, parameters, gives, examples, run } = entry;
  if (typeof name !== 'string' || !NAME.test(name)) {
    return `the name ${String(name)} instead of upper-case words joined by dots, family first, such as PLANT.HALF`;
  }
  if (typeof summary !== 'string') return 'no summary';
  if (typeof parameters !== 'object' || parameters === null) return 'no parameters';
  if (!Object.values(parameters).every(isParameter)) return 'a parameter that does not say how it is read';
  if (typeof gives !== 'string') return 'no words for what it gives';
  if (!Array.isArray(examples)) return 'no list of examples (it may be empty)';
  return typeof run === 'function' ? null : 'a run that is no function';
}

function isParameter(parameter: unknown): boolean {
  return typeof parameter === 'object' && parameter !== null && 'read' in parameter && 'summary' in parameter;
}

function refuseTaken(functions: readonly CellFunction[]): void {
  const taken = new Set(catalogue.map(({ name }) => name));
  for (const { name } of functions) {
    if (taken.has(name)) throw inputError('function-name-taken', { name });
    taken.add(name);
  }
}
