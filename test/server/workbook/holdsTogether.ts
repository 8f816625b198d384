import { expect } from 'vitest';
import { serverErrorTable } from '../../../server/problems.ts';
import { readReference } from '../../../server/workbook/address.ts';
import { workbookDocument } from '../../../server/workbook/documentSchema.ts';
import { parseDocument } from 'yaml';
import { problemsOf, readText } from './readText.ts';

const CODES = new Set<string>(serverErrorTable().map(({ code }) => code));

/** A text is either a workbook that holds together, or has coded problems at places in the file. */
export function expectWorkbookOrProblems(text: string): 'workbook' | 'problems' {
  const problems = problemsOf(text);
  for (const { code, message, line, column } of problems) {
    expect(CODES).toContain(code);
    expect(message).not.toMatch(/undefined|\[object/);
    expect(message.length).toBeLessThan(1000);
    expect(Math.min(line, column)).toBeGreaterThanOrEqual(1);
  }
  if (problems.length > 0) return 'problems';
  const workbook = readText(text);
  expect(JSON.parse(JSON.stringify(workbook))).toEqual(workbook);
  for (const { rows } of workbook.sheets) expect(new Set(rows.map((row) => row.length)).size).toBeLessThan(2);
  for (const { cell } of [...workbook.inputs, ...workbook.outputs])
    expect(readReference(cell)).not.toBeNull();
  expect(workbookDocument.safeParse(parseDocument(text, { schema: 'core' }).toJS()).success).toBe(true);
  return 'workbook';
}
