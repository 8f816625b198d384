import { suggestion } from '../nearest.ts';
import { serverError } from '../problems.ts';
import { columnCount, isOneCell, readReference, rowCount } from './address.ts';
import { PER_CENT, type WorkbookFrame } from './documentSchema.ts';
import type { Path, Report } from './fileProblems.ts';
import { type Check, type Expectation, type Input, type Output, type Tolerance, isRows } from './model.ts';
import { isWithin } from './readInputs.ts';

type WrittenCheck = NonNullable<WorkbookFrame['checks']>[number];
type WrittenTolerance = Exclude<WrittenCheck['within'], object | undefined>;

/** One check with what its reading needs. */
interface Reading {
  readonly check: number;
  readonly path: Path;
  readonly report: Report;
}

/** Reads the acceptance cases; each names inputs and outputs that there are. */
export function readChecks(
  checks: readonly WrittenCheck[],
  inputs: readonly Input[],
  outputs: readonly Output[],
  report: Report,
): Check[] {
  return checks.map((written, index) => {
    const reading: Reading = { check: index + 1, path: ['checks', index], report };
    const given = written.given ?? {};
    refuseGiven(given, inputs, reading);
    return { given, expect: readExpectations(written, outputs, reading), source: written.source };
  });
}

function refuseGiven(
  given: Check['given'],
  inputs: readonly Input[],
  { check, path, report }: Reading,
): void {
  for (const [name, value] of Object.entries(given)) {
    const place = [...path, 'given', name];
    const input = inputs.find((candidate) => candidate.name === name);
    if (input === undefined) {
      const nearest = suggestion(
        name,
        inputs.map((known) => known.name),
      );
      report(serverError('check-name', { check, name, kind: 'input', nearest }), place, 'key');
    } else if (typeof value === 'number' && !isWithin(value, input.min, input.max)) {
      const limits = { min: input.min ?? 'none', max: input.max ?? 'none' };
      report(serverError('check-given', { check, name, value, ...limits }), place);
    }
  }
}

function readExpectations(
  written: WrittenCheck,
  outputs: readonly Output[],
  reading: Reading,
): Expectation[] {
  const { check, path, report } = reading;
  const expectations = Object.entries(written.expect).map(([name, expected]): Expectation => {
    const place = [...path, 'expect', name];
    const output = outputs.find((candidate) => candidate.name === name);
    if (output === undefined) {
      const nearest = suggestion(
        name,
        outputs.map((known) => known.name),
      );
      report(serverError('check-name', { check, name, kind: 'output', nearest }), place, 'key');
      return { output: name, expected, within: null };
    }
    refuseOtherSize(name, expected, output, reading);
    const within = hasNumber(expected) ? toleranceOf(name, written.within) : null;
    if (within === null && hasNumber(expected))
      report(serverError('check-tolerance', { check, name }), place);
    if (within !== null && allowsNothing(expected, within)) {
      report(serverError('check-zero', { check, name }), place);
    }
    return { output: name, expected, within };
  });
  if (expectations.length === 0) report(serverError('check-empty', { check }), [...path, 'expect']);
  refuseStrayTolerances(written, reading);
  return expectations;
}

function refuseOtherSize(
  name: string,
  expected: Expectation['expected'],
  output: Output,
  { check, path, report }: Reading,
): void {
  const area = readReference(output.cell);
  if (area === null) throw new Error('invariant: the address of an output is canonical');
  const found = isRows(expected) ? `${expected.length} rows of ${widths(expected)}` : 'one value';
  const size = isOneCell(area) ? 'one value' : `${rowCount(area)} rows of ${columnCount(area)}`;
  if (found === size) return;
  report(serverError('check-block', { check, found, name, expected: size }), [...path, 'expect', name]);
}

/** How long the rows are: `2`, or `2, 3` where they differ. */
function widths(rows: readonly (readonly unknown[])[]): string {
  return [...new Set(rows.map((row) => row.length))].join(', ');
}

function hasNumber(expected: Expectation['expected']): boolean {
  return isRows(expected)
    ? expected.flat().some((value) => typeof value === 'number')
    : typeof expected === 'number';
}

/** Whether the tolerance is a share of zero throughout; among other numbers a zero is meant exactly. */
function allowsNothing(expected: Expectation['expected'], within: Tolerance): boolean {
  if ('absolute' in within) return false;
  return [expected].flat(2).every((value) => typeof value !== 'number' || value === 0);
}

function toleranceOf(name: string, within: WrittenCheck['within']): Tolerance | null {
  const written =
    typeof within === 'object' ? (Object.hasOwn(within, name) ? within[name] : undefined) : within;
  return written === undefined ? null : readTolerance(written);
}

const HUNDRED_PER_CENT = 100;

function readTolerance(written: WrittenTolerance): Tolerance {
  if (typeof written === 'number') return { absolute: written };
  return { relative: Number(PER_CENT.exec(written)?.[1]) / HUNDRED_PER_CENT };
}

function refuseStrayTolerances({ within, expect }: WrittenCheck, { check, path, report }: Reading): void {
  if (typeof within !== 'object') return;
  for (const name of Object.keys(within).filter((key) => !Object.hasOwn(expect, key))) {
    const nearest = suggestion(name, Object.keys(expect));
    const details = { check, name, kind: 'expected output', nearest };
    report(serverError('check-name', details), [...path, 'within', name], 'key');
  }
}
