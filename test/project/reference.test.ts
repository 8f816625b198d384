import { describe, expect, it } from 'vitest';
import { usage } from '../../functions/cells/call.ts';
import { catalogue } from '../../functions/catalogue.ts';
import { errorTable } from '../../functions/errors.ts';
import { files as referenceFiles } from '../../scripts/generate/functionReference.ts';
import { files as schemaFiles } from '../../scripts/generate/evaluationSchema.ts';
import { evaluateWorkbook } from '../../server/engine/evaluateWorkbook.ts';
import { serverErrorTable } from '../../server/problems.ts';
import { kettle } from '../server/http/appOf.ts';

describe('the reference', () => {
  const { text } = referenceFiles()[0]!;

  it.each([...catalogue])('describes $name: usage, arguments, answer, examples, sources', (entry) => {
    const from = text.indexOf(`### ${entry.name}\n`);
    const section = text.slice(from, text.indexOf('\n##', from + 1));
    expect(section).toContain(entry.summary);
    expect(section).toContain(`${entry.name}(${usage(entry)})`);
    for (const argument of Object.keys(entry.parameters)) expect(section).toContain(`| ${argument} |`);
    expect(section).toContain(`Gives ${entry.gives}.`);
    for (const { formula, source } of entry.examples) {
      expect(section).toContain(formula);
      expect(section).toContain(source);
    }
    for (const source of entry.sources ?? []) expect(section).toContain(source);
  });

  it('lists every error with a remedy', () => {
    for (const { code, remedy } of [...errorTable(), ...serverErrorTable()]) {
      expect(remedy).not.toBe('');
      expect(text).toContain(`| \`${code}\` | `);
    }
  });
});

describe('the schema of an evaluation', () => {
  const { text } = schemaFiles()[0]!;
  const { definitions } = JSON.parse(text) as {
    definitions: Record<string, { required: string[]; additionalProperties: boolean }>;
  };
  const evaluation = evaluateWorkbook(kettle);

  it.each([
    ['Evaluation', evaluation],
    ['WorkbookIdentity', evaluation.workbook],
    ['Versions', evaluation.versions],
    ['InputValue', evaluation.inputs.acid!],
    ['OutputValue', evaluation.outputs.extent!],
    ['FormulaCell', evaluation.formulas['Kettle!E3']!],
    ['FunctionAnswer', evaluation.formulas['Kettle!E3']!.answers[0]!],
    ['CheckResult', evaluation.checks[0]!],
  ])('has exactly the keys of a real one: %s', (name, real: object) => {
    expect(definitions[name]!.required.toSorted()).toEqual(Object.keys(real).toSorted());
    expect(definitions[name]!.additionalProperties).toBe(false);
  });
});
