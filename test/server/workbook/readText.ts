import { type FileProblem, UnusableWorkbook } from '../../../server/workbook/fileProblems.ts';
import type { Workbook } from '../../../server/workbook/model.ts';
import { readYamlWorkbook } from '../../../server/workbook/yaml.ts';

/** The workbook in a text. */
export function readText(text: string): Workbook {
  return readYamlWorkbook(new TextEncoder().encode(text), 'test.yaml');
}

/** What is wrong with a text; nothing when it is a workbook. Any other error is thrown on. */
export function problemsOf(text: string): readonly FileProblem[] {
  try {
    readText(text);
    return [];
  } catch (error) {
    if (error instanceof UnusableWorkbook) return error.problems;
    throw error;
  }
}

/** A workbook whose one sheet, Kettle, has these entries; further lines follow it. */
export function kettle(entries: string, further = ''): string {
  const indented = entries.replace(/^/gm, '    ');
  return `workbook: 1\ntitle: Test\nsheets:\n  Kettle:\n${indented}\n${further}`;
}
