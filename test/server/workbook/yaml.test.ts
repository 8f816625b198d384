import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import type { CellContent } from '../../../server/workbook/model.ts';
import { kettle, problemsOf, readText } from './readText.ts';

function cells(entries: string): readonly (readonly CellContent[])[] {
  return readText(kettle(entries)).sheets[0]?.rows ?? [];
}

describe('a text workbook', () => {
  const text = kettle(
    [
      'A1: Charge at 70 degC',
      'A3:',
      '  - [species, amount, unit]',
      '  - [acid, 2.0, mol]',
      "E3: '=B4*2'",
      "G4:G5: '=B4/SUM(B$4:B$7)'",
    ].join('\n'),
    [
      'about: Invented example.',
      'names: {charge: kettle!A3:C4}',
      'inputs:',
      '  acid: {cell: Kettle!$B$4, unit: mol, min: 0, uncertainty: 0.01}',
      'outputs:',
      '  extent: {cell: Kettle!E3, unit: mol, digits: 5}',
      '  shares: {cell: Kettle!G4:G5}',
      'checks:',
      '  - given: {acid: 1.0}',
      '    expect: {extent: 2, shares: [[0.5], [{error: division-by-zero}]]}',
      '    within: {extent: 0.001, shares: 0.1 %}',
      '    source: worked by hand',
      '  - {expect: {extent: {status: blocked}}, source: by hand}',
    ].join('\n'),
  );
  const workbook = readText(text);

  it('is read as plain data with canonical addresses', () => {
    const word = (it: string) => ({ text: it });
    expect(workbook).toEqual({
      title: 'Test',
      about: 'Invented example.',
      file: 'test.yaml',
      sha256: createHash('sha256').update(text).digest('hex'),
      names: { charge: 'Kettle!$A$3:$C$4' },
      sheets: [
        {
          name: 'Kettle',
          rows: [
            [word('Charge at 70 degC'), null, null, null, null, null, null],
            [null, null, null, null, null, null, null],
            [word('species'), word('amount'), word('unit'), null, { formula: '=B4*2' }, null, null],
            [word('acid'), 2, word('mol'), null, null, null, { formula: '=B4/SUM(B$4:B$7)' }],
            [null, null, null, null, null, null, { formula: '=B5/SUM(B$4:B$7)' }],
          ],
        },
      ],
      inputs: [{ name: 'acid', cell: 'Kettle!B4', unit: 'mol', min: 0, max: null, uncertainty: 0.01 }],
      outputs: [
        { name: 'extent', cell: 'Kettle!E3', unit: 'mol', digits: 5 },
        { name: 'shares', cell: 'Kettle!G4:G5', unit: null, digits: null },
      ],
      checks: [
        {
          given: { acid: 1 },
          expect: [
            { output: 'extent', expected: 2, within: { absolute: 0.001 } },
            {
              output: 'shares',
              expected: [[0.5], [{ error: 'division-by-zero' }]],
              within: { relative: 0.001 },
            },
          ],
          source: 'worked by hand',
        },
        {
          given: {},
          expect: [{ output: 'extent', expected: { status: 'blocked' }, within: null }],
          source: 'by hand',
        },
      ],
      arrayArithmetic: true,
    });
  });

  it('survives JSON', () => {
    expect(JSON.parse(JSON.stringify(workbook))).toEqual(workbook);
  });

  it('may begin with a byte order mark and end its lines as Windows does', () => {
    const { sheets } = readText(`\ufeff${text.replaceAll('\n', '\r\n')}`);
    expect(sheets).toEqual(workbook.sheets);
  });
});

describe('a cell', () => {
  // YAML 1.2.2, core schema: section 10.3.
  it.each<[string, CellContent]>([
    ['no', { text: 'no' }],
    ['NO', { text: 'NO' }],
    ['yes', { text: 'yes' }],
    ['off', { text: 'off' }],
    ['2024-01-02', { text: '2024-01-02' }],
    ['1/2/2024', { text: '1/2/2024' }],
    ['12:30', { text: '12:30' }],
    ['50%', { text: '50%' }],
    ['1_000', { text: '1_000' }],
    ['"007"', { text: '007' }],
    ["'1,5'", { text: '1,5' }],
    ["'true'", { text: 'true' }],
    ['1e3', 1000],
    ['1E-14', 1e-14],
    ['-.5', -0.5],
    ['+5.', 5],
    ['true', true],
    ['False', false],
    ['\'=A1 # "x": y\'', { formula: '=A1 # "x": y' }],
    ['>-\n  =A2\n  +A3', { formula: '=A2 +A3' }],
    ['{text: "= or <=>"}', { text: '= or <=>' }],
    ['Ca^2+', { text: 'Ca^2+' }],
  ])('given as %s holds %o', (written, content) => {
    expect(cells(`A1: ${written}`)).toEqual([[content]]);
  });

  it('holds no negative zero, which JSON would lose', () => {
    expect(Object.is(cells('A1: -0')[0]?.[0], 0)).toBe(true);
  });

  it('is blank where a row says null, nothing or an empty text, or ends early', () => {
    expect(cells('A1:\n  - [1, null, ~]\n  - [2, ""]\n  - []\n  -\n    - 3\n    -')).toEqual([
      [1, null, null],
      [2, null, null],
      [null, null, null],
      [3, null, null],
    ]);
  });

  it('repeats the value of a range', () => {
    expect(cells('A1:B2: mol')).toEqual(Array(2).fill(Array(2).fill({ text: 'mol' })));
  });

  it('takes a formula filled both ways', () => {
    expect(cells("A1:B2: '=D$4+$E5'")).toEqual([
      [{ formula: '=D$4+$E5' }, { formula: '=E$4+$E5' }],
      [{ formula: '=D$4+$E6' }, { formula: '=E$4+$E6' }],
    ]);
  });
});

describe('the unit beside an input', () => {
  const units = (unit: string, row: string) =>
    problemsOf(kettle(`A1: [${row}]`, `inputs: {q: {cell: Kettle!B1, unit: ${unit}}}`));

  it.each([
    ['mol', '[acid, 2, mol]'],
    ['L', '[volume, 2, l]'],
    ['°C', '[temperature, 2, degC]'],
    ['kmol', '[acid, 2, from the log book]'],
    ['kmol', '[acid, 2, 5]'],
    ['kmol', '[1, 2, mol]'],
    ['buckets', '[acid, 2, buckets]'],
  ])('agrees: %s in %s', (unit, row) => {
    expect(units(unit, row)).toEqual([]);
  });

  it.each([
    ['kmol', '[acid, 2, mol]'],
    ['K', '[temperature, 2, degC]'],
    ['buckets', '[acid, 2, mol]'],
  ])('disagrees: %s in %s', (unit, row) => {
    expect(units(unit, row)).toEqual([expect.objectContaining({ code: 'input-unit' })]);
  });
});
