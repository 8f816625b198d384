/** How strictly a conditions table is read, met through formula cells. */
import { describe, expect, it } from 'vitest';
import type { CellTable } from '../../../functions/cells/entry.ts';
import { messageFrom, numberOf, rowsOf } from './asking.ts';

/** A gas that doubles, 1 mol of each, at these conditions. */
const asked = (name: string, conditions: CellTable, more = '') =>
  [
    `=${name}("A(g) = 2 B(g)", 2, A1:C2, E1:${'FGH'[conditions[0]!.length - 2]!}${conditions.length}${more})`,
    {
      A1: [
        ['A(g)', 1, 'mol'],
        ['B(g)', 1, 'mol'],
      ] as CellTable,
      E1: conditions,
    },
  ] as const;

const extent = (...conditions: CellTable) => numberOf(...asked('EXTENT.SOLVE', conditions));
const refused = (code: string, ...conditions: CellTable) =>
  messageFrom(code, ...asked('EXTENT.SOLVE', conditions));

describe('a conditions table', () => {
  it('has its rows in any order, with or without a heading, and blank ones between', () => {
    const plain = extent(['pressure', 3, 'bar'], ['K in terms of', 'pressure', 'atm']);
    expect(extent(['K in terms of', 'pressure', 'atm'], ['pressure', 3, 'bar'])).toBe(plain);
    expect(
      extent(
        ['quantity', 'value', 'unit'],
        ['pressure', 3, 'bar'],
        [null, null, null],
        ['K in terms of', 'pressure', 'atm'],
      ),
    ).toBe(plain);
    expect(extent([' Pressure ', 3, 'bar'], ['k in terms of', 'Pressure', 'atm'])).toBe(plain);
  });

  it('is an error where a quantity is unknown, and says which there are', () => {
    const message = refused('condition-unknown', ['pressure', 1, 'bar'], ['presure', 1, 'bar']);
    expect(message).toContain('row 2');
    expect(message).toContain('temperature, pressure, barometer, volume');
  });

  it('is an error where a quantity stands twice, and says where it stood first', () => {
    const message = refused('condition-twice', ['pressure', 1, 'bar'], ['pressure', 1, 'bar']);
    expect(message).toMatch(/row 2 .*row 1/);
  });

  it('is an error where a unit is missing, wrong, unknown, or where none belongs', () => {
    expect(refused('condition-unit', ['pressure', 1, null])).toContain('no unit');
    expect(refused('condition-unit', ['pressure', 1, 'K'])).toContain(
      'a unit of pressure such as bar or kPa',
    );
    expect(refused('unit-unknown', ['pressure', 1, 'Bar'])).toContain('row 1 (pressure)');
    expect(refused('condition-unit', ['pressure', 1, 'bar'], ['medium', 'gas', 'bar'])).toContain(
      'row 2 (medium)',
    );
  });

  it('is an error where a value is no number, or no word of the choice', () => {
    expect(refused('condition-value', ['pressure', '1', 'bar'])).toContain('the text "1"');
    const message = refused('condition-value', ['pressure', 1, 'bar'], ['medium', 'vapour', null]);
    expect(message).toContain('as given, gas, solution, ideal liquid');
  });

  it('is an error where a value cannot be, needed or not', () => {
    expect(refused('condition-value', ['pressure', -3, 'bar'])).toContain('-3 bar');
    expect(refused('condition-value', ['pressure', 1, 'bar'], ['temperature', -300, 'degC'])).toContain(
      'row 2',
    );
    expect(refused('condition-value', ['volume', 0, 'L'], ['temperature', 300, 'K'])).toContain('volume');
    const uncertain = refused('condition-value', ['pressure', 1, 'bar'], ['K uncertainty', -0.1, null]);
    expect(uncertain).toContain('a number of 0 or more');
  });

  it('is an error where it is no table, or too wide', () => {
    expect(messageFrom('condition-table', '=EXTENT.SOLVE("A = B", 2, {1;1}, "1 bar")')).toContain('1 bar');
    const wide: CellTable = [['pressure', 1, 'bar', 0, 'remark']];
    const given = { E1: wide };
    expect(messageFrom('condition-table', '=EXTENT.SOLVE("A = B", 2, {1;1}, E1:I1)', given)).toContain(
      '1 x 5',
    );
  });

  it('may serve many formulas: rows that this one does not need are listed, not refused', () => {
    const rows: CellTable = [
      ['temperature', 70, 'degC'],
      ['pressure', 1, 'bar'],
      ['barometer', 1, 'bar'],
    ];
    expect(rowsOf(...asked('EXTENT.EVIDENCE', rows, ', "conditions not needed"'))).toEqual([
      ['temperature, barometer'],
    ]);
  });
});

describe('a gauge pressure', () => {
  it('counts from the barometer', () => {
    const gauge = extent(['pressure', 2, 'bar gauge'], ['barometer', 990, 'mbar']);
    expect(Math.abs(gauge - extent(['pressure', 2.99, 'bar']))).toBeLessThan(1e-15);
  });

  it('may be a vacuum, but not below nothing', () => {
    expect(extent(['pressure', -0.5, 'bar gauge'], ['barometer', 1, 'bar'])).toBeGreaterThan(0);
    expect(refused('condition-range', ['pressure', -1.2, 'bar gauge'], ['barometer', 1, 'bar'])).toContain(
      'pressure',
    );
  });

  it('without a barometer is an error that asks for the row', () => {
    expect(refused('condition-missing', ['pressure', 2, 'bar gauge'])).toContain('Add the row barometer');
  });
});

describe('the constant', () => {
  const asLogarithm = (K: number, words: string) =>
    numberOf(`=EXTENT.SOLVE("A = B", ${K}, {1;1}, CONDITIONS.TABLE("K written as", "${words}", ""))`);

  it('may be written as K, ln K or log10 K', () => {
    const K = 1000;
    const plain = asLogarithm(K, 'K');
    expect(Math.abs(asLogarithm(3, 'log10 K') / plain - 1)).toBeLessThan(1e-15);
    expect(Math.abs(asLogarithm(Math.log(K), 'ln K') / plain - 1)).toBeLessThan(1e-15);
  });

  it('of nothing or less, or beyond all measure, is an error', () => {
    expect(messageFrom('constant-value', '=EXTENT.SOLVE("A = B", 0, {1;1})')).toContain('K = 0');
    const beyond = '=EXTENT.SOLVE("A = B", 1501, {1;1}, CONDITIONS.TABLE("K written as", "ln K", ""))';
    expect(messageFrom('constant-value', beyond)).toContain('ln K = 1501');
  });
});

describe('standard uncertainties', () => {
  /** At a fixed volume the activities go with the temperature, so that its uncertainty counts. */
  const probability = (...rows: CellTable) => numberOf(...asked('REACTION.FORWARD.PROBABILITY', rows));
  const hot = (u: number | null, unit: string, value: number): CellTable => [
    ['temperature', value, unit, u],
    ['volume', 10, 'L', null],
  ];

  it('convert as differences: 2 degC of uncertainty is 2 K and 3.6 degF', () => {
    const inKelvin = probability(...hot(2, 'K', 350));
    expect(inKelvin).not.toBe(0.5);
    expect(Math.abs(probability(...hot(2, 'degC', 76.85)) - inKelvin)).toBeLessThan(1e-13);
    expect(Math.abs(probability(...hot(3.6, 'degF', 170.33)) - inKelvin)).toBeLessThan(1e-13);
  });

  it('may have a row of their own, in a unit of their own', () => {
    const own = probability(
      ['temperature', 76.85, 'degC'],
      ['volume', 10, 'L'],
      ['temperature uncertainty', 2, 'K'],
    );
    expect(Math.abs(own - probability(...hot(2, 'K', 350)))).toBeLessThan(1e-13);
  });

  it('of a gauge pressure may be in bar, for the barometer drops out of a difference', () => {
    const gauge = (unit: string) =>
      probability(['pressure', 2, 'bar gauge'], ['barometer', 1, 'bar'], ['pressure uncertainty', 0.1, unit]);
    expect(gauge('bar')).toBe(gauge('bar gauge'));
    expect(gauge('bar')).not.toBe(0.5);
  });

  it('alone, twice, or below zero are errors', () => {
    expect(refused('condition-uncertainty-alone', ['temperature uncertainty', 2, 'K'])).toContain(
      'temperature',
    );
    const twice: CellTable = [...hot(2, 'K', 350), ['temperature uncertainty', 2, 'K', null]];
    expect(refused('condition-twice', ...twice)).toContain('temperature uncertainty');
    expect(refused('condition-uncertainty', ...hot(-2, 'K', 350))).toContain('row 1 (temperature)');
  });

  it('that leave both directions open at 95 % make the direction undecided', () => {
    const direction = (u: number) =>
      rowsOf('=REACTION.DIRECTION("A = B", 2, {1;1}, E1:F1)', { E1: [['K uncertainty', u]] });
    // ln(K/Q) = ln 2 = 0.693: 1.96 standard uncertainties of 0.35, and less than those of 0.36.
    expect(direction(0.35)).toEqual([['forward']]);
    expect(direction(0.36)).toEqual([['undecided']]);
  });
});
