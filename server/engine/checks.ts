/**
 * Compares what a workbook's check expects with what was found.
 */
import type { Status } from '../../functions/equilibrium/outcome.ts';
import type { CheckResult, FunctionAnswer, OutputValue, Value } from '../evaluation.ts';
import { isError } from '../evaluation.ts';
import { type Check, type Expectation, type Expected, isRows, type Tolerance } from '../workbook/model.ts';

/** The statuses of the equilibria that a cell solved. */
export function statusesOf(answers: readonly FunctionAnswer[]): Status[] {
  return answers.flatMap(({ outcome }) => (outcome === null ? [] : [outcome.status]));
}

/** `found` holds every output of the workbook; `statuses` those of the cell at an address. */
export function checkResult(
  check: Check,
  found: Readonly<Record<string, OutputValue>>,
  statuses: (address: string) => Status[],
): CheckResult {
  const asked = check.expect.map((expectation) => ({ expectation, output: found[expectation.output]! }));
  return {
    passed: asked.every(({ expectation, output }) => meets(expectation, output, statuses)),
    given: check.given,
    expected: Object.fromEntries(asked.map(({ expectation: { output, expected } }) => [output, expected])),
    found: Object.fromEntries(asked.map(({ expectation, output }) => [expectation.output, output.value])),
    within: Object.fromEntries(asked.map(({ expectation: { output, within } }) => [output, within])),
    source: check.source,
  };
}

function meets(
  { expected, within }: Expectation,
  { cell, value }: OutputValue,
  statuses: (address: string) => Status[],
): boolean {
  if (!isRows(expected)) {
    if (isRows(value)) return false;
    if (isStatus(expected)) return statuses(cell).includes(expected.status);
    return agrees(expected, value, within);
  }
  if (!isRows(value) || value.length !== expected.length) return false;
  return expected.every(
    (row, r) =>
      row.length === value[r]!.length && row.every((cell, c) => agrees(cell, value[r]![c]!, within)),
  );
}

function agrees(expected: Expected, found: Value, within: Tolerance | null): boolean {
  if (typeof expected === 'number') return typeof found === 'number' && isNear(expected, found, within!);
  if (typeof expected !== 'object' || expected === null) return expected === found;
  return 'error' in expected && isError(found) && found.error === expected.error;
}

function isNear(expected: number, found: number, within: Tolerance): boolean {
  const allowed = 'absolute' in within ? within.absolute : within.relative * Math.abs(expected);
  return Math.abs(found - expected) <= allowed;
}

function isStatus(expected: Expected): expected is { readonly status: Status } {
  return typeof expected === 'object' && expected !== null && 'status' in expected;
}
