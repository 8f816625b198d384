/** Every example of the catalogue runs, and every function has one. */
import { describe, expect, it } from 'vitest';
import { catalogue } from '../../../functions/catalogue.ts';
import type { CellScalar, CellValue, Example } from '../../../functions/cells/entry.ts';
import { formulaValue } from '../formulaValue.ts';

describe.each(catalogue.map((entry) => [entry.name, entry] as const))('%s', (_, entry) => {
  it('has an example', () => expect(entry.examples.length).toBeGreaterThan(0));
  it.each(entry.examples.map((example) => [example.formula, example] as const))('%s', (_, example) => {
    expectExample(example);
  });
});

function expectExample({ cells, formula, gives, within = 0 }: Example): void {
  const found = formulaValue(formula, cells);
  if (typeof gives === 'object' && gives !== null && 'error' in gives) {
    // The error of an array answer stands in each of its cells.
    expect(rows(found as CellValue)[0]![0]).toMatchObject(gives);
    return;
  }
  const expected = rows(gives);
  const values = rows(found as CellValue);
  expect(values.map((row) => row.length)).toEqual(expected.map((row) => row.length));
  expected.flat().forEach((wanted, i) => expectCell(values.flat()[i]!, wanted, within));
}

function expectCell(found: CellScalar, wanted: CellScalar, within: number): void {
  if (typeof wanted !== 'number' || within === 0) expect(found).toBe(wanted);
  else expect(Math.abs((found as number) - wanted)).toBeLessThanOrEqual(within * Math.abs(wanted));
}

function rows(value: CellValue) {
  return Array.isArray(value) ? (value as readonly (readonly CellScalar[])[]) : [[value as CellScalar]];
}
