/** Forms of tables are remembered; what was read before must not show in what is read next. */
import { expect, it } from 'vitest';
import type { CellTable } from '../../../functions/cells/entry.ts';
import { messageFrom, numberOf } from './asking.ts';

/** The extent of A = B at K = 1 from 1 mol of A alone is 0.5 mol. */
const asked = (range: string) => `=EXTENT.SOLVE("A = B", 1, ${range})`;

it('a number in the place of a heading is an error, also after the same table without it', () => {
  const headed = (uncertainty: string | number | null): CellTable => [
    ['species', 'amount', 'unit', uncertainty],
    ['A', 1, 'mol', null],
    ['B', 0, 'mol', null],
  ];
  expect(numberOf(asked('A1:D3'), { A1: headed(null) })).toBe(0.5);
  expect(messageFrom('heading-uncertainty', asked('A1:D3'), { A1: headed(5) })).toContain('5');
  expect(numberOf(asked('A1:D3'), { A1: headed('standard uncertainty') })).toBe(0.5);
});

it('a word with line breaks and tabs is not taken for the words of several lines', () => {
  const feed: CellTable = [
    ['A', 1, 'mol'],
    ['B', 0, 'mol'],
    ['C', 0, 'mol'],
  ];
  const run = [feed[0]!, ['B', 0, 'mol\nC\tmol']];
  expect(numberOf(asked('A1:C3'), { A1: feed })).toBe(0.5);
  expect(messageFrom('unit-unknown', asked('A1:C2'), { A1: run })).toContain('row 2 (B)');
});

it('two tables by turns keep their units', () => {
  const feed = (unit: string): CellTable => [
    ['A', 1, 'mol'],
    ['B', 1, unit],
  ];
  for (let turn = 0; turn < 2; turn++) {
    expect(numberOf(asked('A1:C2'), { A1: feed('mol') })).toBe(0);
    expect(numberOf(asked('A1:C2'), { A1: feed('kmol') })).toBe(-499.5);
  }
});
