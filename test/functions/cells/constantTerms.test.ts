/** In which terms a constant may be stated in each medium, met through formula cells. */
import { describe, expect, it } from 'vitest';
import type { CellTable } from '../../../functions/cells/entry.ts';
import { messageFrom, numberOf } from './asking.ts';
import { doubling } from './doubling.ts';

const R = 0.0831446261815324; // L bar/(mol K), CODATA 2018

const terms = (words: string, unit: string | null = null): CellTable[number] => [
  'K in terms of',
  words,
  unit,
];

/** A medium of the doubling reaction, its constant in activities, and the same constant in other terms. */
interface Stated {
  readonly medium: string;
  readonly tag: string;
  readonly unit: string;
  readonly rows: CellTable;
  readonly K: number;
  /** Terms, and the number by which K is to be divided in them. */
  readonly others: readonly (readonly [words: string, unit: string | null, divisor: number])[];
}

const STATED: readonly Stated[] = [
  {
    medium: 'a gas at a pressure',
    tag: '(g)',
    unit: 'mol',
    rows: [
      ['pressure', 4, 'bar'],
      ['temperature', 500, 'K'],
    ],
    K: 3,
    others: [
      ['activity', null, 1],
      ['activity', 'bar', 1],
      ['pressure', 'bar', 1],
      ['pressure', 'kPa', 0.01],
      ['pressure', 'atm', 1.01325],
      ['concentration', 'mol/L', R * 500],
      ['concentration', 'mol/m3', (R * 500) / 1000],
      ['mole fraction', null, 4],
    ],
  },
  {
    medium: 'a gas in a volume',
    tag: '(g)',
    unit: 'mol',
    rows: [
      ['volume', 20, 'L'],
      ['temperature', 500, 'K'],
    ],
    K: 3,
    others: [
      ['activity', null, 1],
      ['pressure', 'atm', 1.01325],
      ['concentration', 'mol/L', R * 500],
    ],
  },
  {
    medium: 'a solution',
    tag: '(aq)',
    unit: 'mol/L',
    rows: [['medium', 'solution', null]],
    K: 0.02,
    others: [
      ['activity', null, 1],
      ['concentration', 'mol/L', 1],
      ['concentration', 'mmol/L', 0.001],
    ],
  },
  {
    medium: 'an ideal liquid',
    tag: '',
    unit: 'kmol',
    rows: [['medium', 'ideal liquid', null]],
    K: 0.7,
    others: [
      ['activity', null, 1],
      ['mole fraction', null, 1],
    ],
  },
  {
    medium: 'amounts as given',
    tag: '',
    unit: 'mol/L',
    rows: [['medium', 'as given', null]],
    K: 0.02,
    others: [
      ['activity', null, 1],
      ['concentration', 'mol/L', 1],
      ['concentration', 'mmol/L', 0.001],
    ],
  },
];

describe.each(STATED)('K of $medium', ({ tag, unit, rows, K, others }) => {
  const plain = numberOf(...doubling(tag, K, unit, rows));

  it.each(others)('may be in terms of %s %s', (words, reference, divisor) => {
    const restated = numberOf(...doubling(tag, K / divisor, unit, [...rows, terms(words, reference)]));
    // K and its reference are rounded once each, and the extent moves by less than they.
    expect(Math.abs(restated / plain - 1)).toBeLessThan(2e-15);
  });

  it.each(others)('gives Q in the same terms of %s %s', (words, reference, divisor) => {
    const quotient = (conditions: CellTable) => {
      const [formula, cells] = doubling(tag, K, unit, conditions, 'REACTION.QUOTIENT');
      const A1: CellTable = [
        ['A', 1, unit],
        ['B', 0.5, unit],
      ];
      return numberOf(formula.replace(`, ${K}, `, ', '), { ...cells, A1 });
    };
    const found = quotient([...rows, terms(words, reference)]);
    expect(Math.abs((found * divisor) / quotient(rows) - 1)).toBeLessThan(4e-15);
  });
});

describe('terms of K that a medium does not have', () => {
  it.each([
    [
      'a gas in mol/L without a temperature',
      '(g)',
      'mol',
      ['pressure', 1, 'bar'],
      terms('concentration', 'mol/L'),
      'condition-missing',
    ],
    [
      'a gas in a volume in mole fractions',
      '(g)',
      'mol',
      ['volume', 1, 'L'],
      terms('mole fraction'),
      'constant-basis',
    ],
    [
      'a pressure without its unit',
      '(g)',
      'mol',
      ['pressure', 1, 'bar'],
      terms('pressure'),
      'constant-basis',
    ],
    [
      'a mole fraction with a unit',
      '(g)',
      'mol',
      ['pressure', 1, 'bar'],
      terms('mole fraction', 'bar'),
      'constant-basis',
    ],
    [
      'a solution in bar',
      '(aq)',
      'mol/L',
      ['medium', 'solution', null],
      terms('pressure', 'bar'),
      'constant-basis',
    ],
    [
      'a solution in mole fractions',
      '(aq)',
      'mol/L',
      ['medium', 'solution', null],
      terms('mole fraction'),
      'constant-basis',
    ],
    [
      'a liquid in mol/L',
      '',
      'mol',
      ['medium', 'ideal liquid', null],
      terms('concentration', 'mol/L'),
      'constant-basis',
    ],
    [
      'amounts as given in mol/L, K in bar',
      '',
      'mol/L',
      ['medium', 'as given', null],
      terms('pressure', 'bar'),
      'constant-basis',
    ],
  ] as const)('are an error: %s', (_, tag, unit, row, stated, code) => {
    const message = messageFrom(code, ...doubling(tag, 2, unit, [row, stated]));
    if (code === 'constant-basis') expect(message).toContain('K in terms of');
    else expect(message).toContain('Add the row temperature');
  });
});
