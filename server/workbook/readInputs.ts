import { serverError } from '../problems.ts';
import { type Reference, isOneCell, referenceName } from './address.ts';
import type { WorkbookFrame } from './documentSchema.ts';
import type { Report } from './fileProblems.ts';
import { type CellContent, type Input, type Output, type Sheet, isFormula } from './model.ts';
import { readSheetReference, refuseTaken } from './readReferences.ts';
import { isOtherUnit } from './unitBeside.ts';

const ITEM_NAME = /^[\p{L}_][\p{L}\p{N}_.-]*$/u;

/** Reads the inputs; each points at one cell that holds a value within the input's own limits. */
export function readInputs(
  inputs: NonNullable<WorkbookFrame['inputs']>,
  sheets: readonly Sheet[],
  taken: Map<string, string>,
  report: Report,
): Input[] {
  return Object.entries(inputs).flatMap(([name, written]) => {
    const path = ['inputs', name];
    refuseName(name, `the input ${name}`, taken, path, report);
    const cellPath = [...path, 'cell'];
    const reference = readSheetReference(written.cell, sheets, `input ${name}`, cellPath, report);
    if (reference === null) return [];
    const cell = referenceName(reference);
    const input: Input = {
      name,
      cell,
      unit: written.unit ?? null,
      min: written.min ?? null,
      max: written.max ?? null,
      uncertainty: written.uncertainty ?? null,
    };
    if (!isOneCell(reference)) {
      report(serverError('input-range', { name, reference: cell }), cellPath);
      return [];
    }
    const content = contentOf(reference, sheets);
    if (isFormula(content)) report(serverError('input-formula', { name, cell }), cellPath);
    if (content === null) report(serverError('input-blank', { name, cell }), cellPath);
    const limits = limitProblem(input, content);
    if (limits !== null) report(serverError('input-limits', { name, ...limits }), path);
    refuseOtherUnit(input, reference, sheets, report);
    return [input];
  });
}

/** Reads the outputs; each points at a cell or range of a sheet. */
export function readOutputs(
  outputs: NonNullable<WorkbookFrame['outputs']>,
  sheets: readonly Sheet[],
  taken: Map<string, string>,
  report: Report,
): Output[] {
  return Object.entries(outputs).flatMap(([name, { cell, unit = null, digits = null }]) => {
    const path = ['outputs', name];
    refuseName(name, `the output ${name}`, taken, path, report);
    const reference = readSheetReference(cell, sheets, `output ${name}`, [...path, 'cell'], report);
    return reference === null ? [] : [{ name, cell: referenceName(reference), unit, digits }];
  });
}

function refuseName(
  name: string,
  what: string,
  taken: Map<string, string>,
  path: readonly string[],
  report: Report,
): void {
  if (!ITEM_NAME.test(name)) report(serverError('item-name', { name: JSON.stringify(name) }), path, 'key');
  refuseTaken(name, what, taken, path, report);
}

function contentOf({ sheet, firstRow, firstColumn }: Reference, sheets: readonly Sheet[]): CellContent {
  return sheets.find(({ name }) => name === sheet)?.rows[firstRow]?.[firstColumn] ?? null;
}

function limitProblem(
  { min, max, uncertainty }: Input,
  content: CellContent,
): { problem: string; help: string } | null {
  if (min !== null && max !== null && min > max) {
    return { problem: `min ${min} is above max ${max}`, help: 'Exchange them.' };
  }
  if (uncertainty !== null && uncertainty < 0) {
    return { problem: `uncertainty ${uncertainty} is negative`, help: 'Give 0 or more.' };
  }
  if (typeof content === 'number') {
    if (isWithin(content, min, max)) return null;
    return {
      problem: `its cell holds ${content}, outside its own limits`,
      help: 'Mend the value or the limits.',
    };
  }
  if (min === null && max === null && uncertainty === null) return null;
  if (content === null || isFormula(content)) return null;
  return { problem: 'its cell holds no number', help: 'Leave out min, max and uncertainty.' };
}

/** Whether a value keeps to limits of which either may be missing. */
export function isWithin(value: number, min: number | null, max: number | null): boolean {
  return (min === null || value >= min) && (max === null || value <= max);
}

/** On a labelled row (label, value, unit) the unit beside the cell must be the input's. */
function refuseOtherUnit(input: Input, reference: Reference, sheets: readonly Sheet[], report: Report): void {
  const { firstColumn } = reference;
  const label = contentOf({ ...reference, firstColumn: firstColumn - 1 }, sheets);
  const beside = contentOf({ ...reference, firstColumn: firstColumn + 1 }, sheets);
  if (input.unit === null || !isText(label) || !isText(beside)) return;
  if (!isOtherUnit(input.unit, beside.text)) return;
  const details = { name: input.name, unit: input.unit, cell: input.cell, beside: beside.text };
  report(serverError('input-unit', details), ['inputs', input.name, 'unit']);
}

function isText(content: CellContent): content is { text: string } {
  return typeof content === 'object' && content !== null && 'text' in content;
}
