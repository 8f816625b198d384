/** An evaluation as a person reads it in a terminal. */
import type { Colors } from 'picocolors/types.js';
import type { Given } from '../engine/host.ts';
import { type CheckResult, type Evaluation, isError, type Value } from '../evaluation.ts';
import { foundDigits, toleranceText } from '../render/checkNumbers.ts';
import { numberText } from '../render/numberText.ts';
import { isSettled } from '../render/statusWords.ts';
import { isRows } from '../workbook/model.ts';
import { endingLines, endingsAt, equilibria } from './equilibria.ts';
import type { Evaluated } from './evaluation.ts';

/** Of a range in a check the first rows tell which it is. */
const MOST_ROWS = 6;

interface Showing {
  readonly cells: boolean;
  readonly colors: Colors;
}

export function answerText({ given, evaluation }: Evaluated, { cells, colors }: Showing): string {
  const { workbook, sheets, checks } = evaluation;
  const needing = attentionLines(evaluation);
  const parts = [
    [colors.bold(workbook.title), ...givenLines(given)],
    outputLines(evaluation),
    cells ? Object.entries(sheets).flatMap(([name, rows]) => [`${name}:`, ...rows.map(tabbed)]) : [],
    checks.flatMap((check, index) => checkLines(check, index + 1, colors)),
    needing.length === 0 ? [] : [colors.bold('Needs attention'), ...needing.map((line) => `  ${line}`)],
  ];
  const blocks = parts.filter((lines) => lines.length > 0).map((lines) => lines.join('\n'));
  return `${blocks.join('\n\n')}\n`;
}

/** Where errors begin, those beside an output not again in full; then what did not bring Q to K. */
function attentionLines(evaluation: Evaluation): string[] {
  const beside = new Map(
    Object.entries(evaluation.outputs).flatMap(([name, { value }]) =>
      valuesOf(value)
        .filter(isError)
        .map(({ message }) => [message, name]),
    ),
  );
  const errors = evaluation.problems.map(({ cell, code, message }) => {
    const output = beside.get(message);
    return `${cell}: ${output === undefined ? message : `${code}, told beside ${output}`}`;
  });
  const unsettled = equilibria(evaluation).filter(({ status }) => !isSettled(status));
  return [...errors, ...endingLines(unsettled)];
}

function givenLines(given: Given): string[] {
  const changes = Object.entries(given).map(([name, value]) => `${name} = ${exactText(value)}`);
  return changes.length === 0 ? [] : [`with ${changes.join(', ')}`];
}

/** Each output with its unit, as many digits as the workbook declares, and how its equilibrium ended. */
function outputLines(evaluation: Evaluation): string[] {
  const outputs = Object.entries(evaluation.outputs);
  if (outputs.length === 0) return ['No outputs are declared.'];
  const width = Math.max(...outputs.map(([name]) => name.length));
  return outputs.flatMap(([name, { value, unit, digits, cell }]) => {
    const head = `${name.padEnd(width)}  `;
    const endings = endingsAt(cell, evaluation);
    const tail = endings.length === 0 ? '' : `; equilibrium ${endings.join(', ')}`;
    if (!isRows(value)) return [`${head}${singleText(value, unit, digits)}${tail}`];
    const rows = value.map((row) => row.map((each) => valueText(each, digits)).join('\t'));
    return [`${head}${cell}${unit === null ? '' : `, in ${unit}`}${tail}`, ...rows.map((row) => `  ${row}`)];
  });
}

function singleText(value: Value, unit: string | null, digits: number | null): string {
  if (value === null) return 'blank, nothing to report';
  return `${valueText(value, digits)}${typeof value === 'number' && unit !== null ? ` ${unit}` : ''}`;
}

function checkLines(
  { passed, given, expected, found, within, source }: CheckResult,
  number: number,
  colors: Colors,
) {
  const state = passed ? 'passed' : colors.bold('NOT PASSED');
  return [
    `${[`check ${number}`, ...givenLines(given)].join(' ')}: ${state}`,
    ...Object.entries(expected).map(([name, value]) => {
      const tolerance = within[name] ?? null;
      const number = (each: number) => numberText(each, foundDigits(each, tolerance, passed));
      const allowed = tolerance === null ? '' : ` within ${toleranceText(tolerance)}`;
      return `  ${name}: expected ${exactText(value)}${allowed}, found ${exactText(found[name], number)}`;
    }),
    `  source: ${source}`,
  ];
}

/**
 * A value on one line: rows stand between brackets; an error, and what a check expects in place of a
 * value, by its code. Numbers have all their digits unless `number` writes them otherwise.
 */
function exactText(value: unknown, number: (value: number) => string = String): string {
  if (typeof value === 'number') return number(value);
  if (typeof value !== 'object' || value === null) return valueText(value as Value);
  if (!isRows(value)) return Object.entries(value)[0]!.join(' ');
  const rows = value.slice(0, MOST_ROWS).map((row) => row.map((each) => exactText(each, number)).join(', '));
  const more = value.length - rows.length;
  return `[${rows.join('; ')}${more > 0 ? `; and ${more} more` : ''}]`;
}

function tabbed(row: readonly Value[]): string {
  return row.map((value) => (value === null ? '' : exactText(value))).join('\t');
}

function valueText(value: Value, digits: number | null = null): string {
  if (value === null) return 'blank';
  if (typeof value === 'number') return numberText(value, digits);
  if (typeof value === 'boolean') return value ? 'TRUE' : 'FALSE';
  return typeof value === 'string' ? value : `no value (${value.message})`;
}

function valuesOf(value: Value | readonly (readonly Value[])[]): readonly Value[] {
  return isRows(value) ? value.flat() : [value];
}
