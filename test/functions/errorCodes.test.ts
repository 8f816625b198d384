/**
 * Every error that an input can cause is raised by a formula, and says what, where and how to mend it.
 */
import { describe, expect, it } from 'vitest';
import { errorTable } from '../../functions/errors.ts';
import type { Value } from '../../server/evaluation.ts';
import { ERROR_CASES } from './errorCases.ts';
import { formulaValue } from './formulaValue.ts';

/** Codes that no formula of the shipped catalogue raises, and where they are tested. */
const RAISED_ELSEWHERE: Readonly<Record<string, string>> = {
  'function-failed': 'a fault of a function, raised by an own function in the tests of the plugin',
  'function-name-taken': 'raised where functions are registered, in the tests of the plugin',
};

/** The first cell; the error of an array answer stands in each of its cells. */
function firstCell(found: Value | Value[][]): Value {
  return Array.isArray(found) ? found[0]![0]! : found;
}

/** A text that the template makes, whatever its words in braces are. */
function made(template: string): string {
  const plain = template.replaceAll(/[.*+?^$()|[\]\\]/g, '\\$&');
  return plain.replaceAll(/\{\w+\}/g, '[^]*');
}

describe.each(errorTable())('$code', ({ code, says, remedy }) => {
  const cases = ERROR_CASES.filter(([wanted]) => wanted === code);
  const elsewhere = RAISED_ELSEWHERE[code];

  it(elsewhere ?? 'is raised by a formula', () => expect(cases.length > 0).toBe(elsewhere === undefined));

  it.each(cases.map((one) => ({ one, formula: one[1] })))('by $formula', ({ one }) => {
    const [, formula, names, cells = {}] = one;
    const error = firstCell(formulaValue(formula, cells));
    expect(error).toMatchObject({ error: code });
    const { message } = error as { message: string };
    const functionName = /^=([A-Z.]+)\(/.exec(formula)![1]!;
    expect(message).toMatch(new RegExp(`^${functionName}: .*${made(says)}\\. ${made(remedy)}$`, 's'));
    expect(message).toContain(names);
    expect(message).not.toMatch(/undefined|null|NaN|\{|\}/);
  });
});

it('no case is for a code that the table does not have', () => {
  const codes = new Set<string>(errorTable().map(({ code }) => code));
  expect(ERROR_CASES.filter(([code]) => !codes.has(code))).toEqual([]);
});
