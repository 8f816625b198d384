import type { z } from 'zod';
import { suggestion } from '../nearest.ts';
import type { InputError } from '../../functions/errors.ts';
import { serverError } from '../problems.ts';
import { type WorkbookFrame, workbookFrame } from './documentSchema.ts';
import type { Path, Report } from './fileProblems.ts';
import { shown } from './shown.ts';
import { type PlainMap, type PlainValue, isPlainMap } from './yamlValues.ts';

/** The keys of what has fixed ones. */
const SHAPE = workbookFrame.shape;
const KEYS: Readonly<Record<string, readonly string[]>> = {
  inputs: Object.keys(SHAPE.inputs.unwrap().valueType.shape),
  outputs: Object.keys(SHAPE.outputs.unwrap().valueType.shape),
  checks: Object.keys(SHAPE.checks.unwrap().element.shape),
};

/** Holds the document against the schema; null when something is wrong, which is reported. */
export function readFrame(document: PlainValue | undefined, report: Report): WorkbookFrame | null {
  if (!isPlainMap(document) || !('workbook' in document)) {
    report(serverError('workbook-version', {}), []);
    return null;
  }
  const frame = workbookFrame.safeParse(document);
  if (frame.success) return frame.data;
  reportIssues(document, frame.error.issues, report);
  return null;
}

function reportIssues(root: PlainMap, issues: readonly z.core.$ZodIssue[], report: Report): void {
  for (const issue of issues) {
    const path = issue.path as Path;
    if (issue.code === 'unrecognized_keys') {
      for (const key of issue.keys) report(unknownKey(key, path), [...path, key], 'key');
    } else {
      report(wrongItem(root, path, issue.message), path);
    }
  }
}

function wrongItem(root: PlainMap, path: Path, wanted: string): InputError {
  const given = valueAt(root, path);
  const where = placeName(path);
  if (given !== undefined) return serverError('workbook-item', { where, given: described(given), wanted });
  return serverError('workbook-missing', {
    where: placeName(path.slice(0, -1)),
    key: String(path.at(-1)),
    wanted,
  });
}

function unknownKey(key: string, path: Path): InputError {
  const known =
    path.length === 0 ? Object.keys(SHAPE) : path.length === 2 ? KEYS[String(path[0])] : undefined;
  const help = known === undefined ? 'Take it out.' : suggestion(key, known);
  return serverError('workbook-key', { key: shown(key), where: placeName(path), nearest: help });
}

/** `inputs.acid.min`, `check 2`, or the workbook itself. */
function placeName([part, item, ...rest]: Path): string {
  if (part === undefined) return 'the workbook';
  if (part === 'checks' && typeof item === 'number') return [`check ${item + 1}`, ...rest].join('.');
  return [part, ...(item === undefined ? [] : [item]), ...rest].join('.');
}

function valueAt(root: PlainMap, path: Path): PlainValue | undefined {
  let value: PlainValue | undefined = root;
  for (const step of path) {
    if (typeof value !== 'object' || value === null) return undefined;
    value = (value as PlainMap)[step];
  }
  return value;
}

function described(value: PlainValue): string {
  if (value === null) return 'empty';
  if (Array.isArray(value)) return 'a list';
  if (typeof value === 'object') return 'a set of keys';
  return typeof value === 'string' ? `the text "${shown(value)}"` : String(value);
}
