/** An evaluation as a person reads it in a terminal. */
import type { Colors } from 'picocolors/types.js';
import type { Given } from '../engine/host.ts';
import type { CheckResult, Evaluation, Value } from '../evaluation.ts';
import { numberText } from '../render/numberText.ts';
import type { Evaluated } from './evaluation.ts';

/** Of a range in a check the first rows tell which it is. */
const MOST_ROWS = 6;

interface Showing {
  readonly cells: boolean;
  readonly colors: Colors;
}

export function answerText({ given, evaluation }: Evaluated, { cells, colors }: Showing): string {
  const { workbook, outputs, sheets, problems, checks } = evaluation;
  const parts = [
    [colors.bold(workbook.title), ...givenLines(given)],
    outputLines(outputs),
    cells ? Object.entries(sheets).flatMap(([name, rows]) => [`${name}:`, ...rows.map(tabbed)]) : [],
    checks.flatMap((check, index) => checkLines(check, index + 1, colors)),
    problems.length === 0
      ? []
      : [colors.bold('Needs attention'), ...problems.map(({ cell, message }) => `  ${cell}: ${message}`)],
  ];
  const blocks = parts.filter((lines) => lines.length > 0).map((lines) => lines.join('\n'));
  return `${blocks.join('\n\n')}\n`;
}

function givenLines(given: Given): string[] {
  const changes = Object.entries(given).map(([name, value]) => `${name} = ${exactText(value)}`);
  return changes.length === 0 ? [] : [`with ${changes.join(', ')}`];
}

/** Each output with its unit and as many digits as the workbook declares; a range row by row. */
function outputLines(outputs: Evaluation['outputs']): string[] {
  const width = Math.max(0, ...Object.keys(outputs).map((name) => name.length));
  return Object.entries(outputs).flatMap(([name, { value, unit, digits, cell }]) => {
    const head = `${name.padEnd(width)}  `;
    const tail = unit === null ? '' : ` ${unit}`;
    if (!isRows(value)) return [`${head}${valueText(value, digits)}${typeof value === 'number' ? tail : ''}`];
    const rows = value.map((row) => row.map((each) => valueText(each, digits)).join('\t'));
    return [`${head}${cell}${unit === null ? '' : `, in ${unit}`}`, ...rows.map((row) => `  ${row}`)];
  });
}

function checkLines(
  { passed, given, expected, found, within, source }: CheckResult,
  number: number,
  colors: Colors,
) {
  const state = passed ? 'passed' : colors.bold('NOT PASSED');
  return [
    `${[`check ${number}`, ...givenLines(given)].join(' ')}: ${state}`,
    ...Object.entries(expected).map(
      ([name, value]) =>
        `  ${name}: expected ${exactText(value)}${withinText(within[name])}, found ${exactText(found[name])}`,
    ),
    `  source: ${source}`,
  ];
}

function withinText(within: CheckResult['within'][string] | undefined): string {
  if (!within) return '';
  return 'absolute' in within ? ` within ${within.absolute}` : ` within ${within.relative} of it`;
}

/**
 * With all digits, because a check may ask for more than an output shows. Rows stand between brackets,
 * so that a check keeps to one line; an error, and what a check expects in place of a value, by its code.
 */
function exactText(value: unknown): string {
  if (typeof value === 'number') return String(value);
  if (typeof value !== 'object' || value === null) return valueText(value as Value);
  if (!isRows(value)) return Object.entries(value)[0]!.join(' ');
  const rows = value.slice(0, MOST_ROWS).map((row) => row.map(exactText).join(', '));
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

function isRows(value: unknown): value is readonly (readonly Value[])[] {
  return Array.isArray(value);
}
