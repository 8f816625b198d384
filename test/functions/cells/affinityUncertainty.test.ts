/**
 * The uncertainty of ln(K/Q) against central differences of REACTION.REDUCED.AFFINITY: each quantity
 * is moved by its own standard uncertainty, and the squares are summed (JCGM 100:2008, 5.1.3, note 2).
 */
import { create, erfDependencies } from 'mathjs';
import { describe, expect, it } from 'vitest';
import type { CellScalar, CellTable } from '../../../functions/cells/entry.ts';
import { numberOf } from './asking.ts';

const mathematics = create(erfDependencies!);

const EQUATION = '"N2(g) + 3 H2(g) = 2 NH3(g)"';
const AMOUNTS: CellTable = [
  ['N2(g)', 1, 'mol', 0.0001],
  ['H2(g)', 2.5, 'mol', 0.0004],
  ['NH3(g)', 0.7, 'mol', 0.0002],
  ['Ar(g)', 0.4, 'mol', 0.0003],
  ['C(s)', 5, 'mol', 2],
];
const LN_K: CellTable[number] = ['K written as', 'ln K', null, null];

/** Row and column of each number with an uncertainty beside it. */
type Place = readonly [table: 'A' | 'F', row: number];

const CASES: readonly (readonly [name: string, conditions: CellTable])[] = [
  [
    'a gas at a gauge pressure, K in mole fractions',
    [
      LN_K,
      ['pressure', 3, 'bar gauge', 0.001],
      ['barometer', 1.01, 'bar', 0.0005],
      ['K in terms of', 'mole fraction', null, null],
    ],
  ],
  [
    'a gas at a gauge pressure, K in atm',
    [
      LN_K,
      ['pressure', 3, 'bar gauge', 0.001],
      ['barometer', 1010, 'mbar', 0.5],
      ['K in terms of', 'pressure', 'atm', null],
    ],
  ],
  [
    'a gas in a volume, K as an activity',
    [LN_K, ['volume', 20, 'L', 0.005], ['temperature', 427, 'degC', 0.1]],
  ],
  [
    'a gas in a volume, K in mol/L',
    [
      LN_K,
      ['volume', 20, 'L', 0.005],
      ['temperature', 427, 'degC', 0.1],
      ['K in terms of', 'concentration', 'mol/L', null],
    ],
  ],
];

const reduced = (lnK: number, amounts: CellTable, conditions: CellTable) =>
  numberOf(`=REACTION.REDUCED.AFFINITY(${EQUATION}, ${lnK}, A1:D5, F1:I${conditions.length})`, {
    A1: amounts,
    F1: conditions,
  });

function moved(table: CellTable, row: number, sign: number): CellTable {
  return table.map((line, r) =>
    r === row
      ? line.map((cell, c): CellScalar => (c === 1 ? (cell as number) + sign * (line[3] as number) : cell))
      : line,
  );
}

function placesIn(table: CellTable, name: Place[0]): Place[] {
  return table.flatMap((line, row) => (typeof line[3] === 'number' ? [[name, row] as const] : []));
}

describe.each(CASES)('%s', (_, conditions) => {
  it('has the uncertainty that its differences show', () => {
    const places = [...placesIn(AMOUNTS, 'A'), ...placesIn(conditions, 'F')];
    const squares = places.map(([table, row]) => {
      const at = (sign: number) =>
        table === 'A'
          ? reduced(0, moved(AMOUNTS, row, sign), conditions)
          : reduced(0, AMOUNTS, moved(conditions, row, sign));
      const half = (at(1) - at(-1)) / 2;
      return half * half;
    });
    const u = Math.sqrt(squares.reduce((sum, square) => sum + square, 0));
    // ln K is set to twice u above ln Q, where the probability is sensitive to u.
    const lnK = 2 * u - reduced(0, AMOUNTS, conditions);
    const probability = numberOf(
      `=REACTION.FORWARD.PROBABILITY(${EQUATION}, ${lnK}, A1:D5, F1:I${conditions.length})`,
      { A1: AMOUNTS, F1: conditions },
    );
    // Differences of second order in relative steps of 1e-3 and less leave 1e-6 of u at most.
    expect(Math.abs(probability - (1 + mathematics.erf(2 / Math.SQRT2)) / 2)).toBeLessThan(1e-6);
  });
});
