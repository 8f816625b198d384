import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  MAX_COLUMNS,
  MAX_ROWS,
  cellName,
  columnLetters,
  columnNumber,
  fixedReferenceName,
  looksLikeCell,
  readArea,
  readReference,
  readWrittenCell,
  referenceName,
} from '../../../server/workbook/address.ts';

const row = fc.nat(MAX_ROWS - 1);
const column = fc.nat(MAX_COLUMNS - 1);

describe('an address', () => {
  // ECMA-376, from memory: columns A to XFD, rows 1 to 1048576.
  it.each([
    ['A', 0],
    ['Z', 25],
    ['AA', 26],
    ['ZZ', 701],
    ['XFD', 16_383],
  ])('counts column %s as %d', (letters, number) => {
    expect(columnNumber(letters)).toBe(number);
    expect(columnLetters(number)).toBe(letters);
  });

  it('is read back as it was written, on the whole sheet', () => {
    fc.assert(
      fc.property(row, column, (r, c) => {
        const written = { row: r, column: c, isRowFixed: false, isColumnFixed: false };
        expect(readWrittenCell(cellName(r, c))).toEqual(written);
      }),
      { seed: 1 },
    );
  });

  it.each(['XFE1', 'A1048577', 'A0', 'A', '1', 'AAAA1', '', 'A1B', 'A-1', ' A1', 'A1:'])(
    'is refused outside the sheet or in another form: %s',
    (text) => {
      expect(readWrittenCell(text)).toBeNull();
      expect(readArea(text)).toBeNull();
    },
  );

  it('has its corners in any order', () => {
    expect(readArea('C7:A3')).toEqual({ firstRow: 2, firstColumn: 0, lastRow: 6, lastColumn: 2 });
  });

  it.each([
    ['kettle!b4', 'kettle!B4'],
    ['Kettle!$A$3:$C$7', 'Kettle!A3:C7'],
    ["'Feed tank'!B4", "'Feed tank'!B4"],
    ["'It''s'!B4", "'It''s'!B4"],
    ["'Kettle'!B4", 'Kettle!B4'],
    ['2024!B4', "'2024'!B4"],
    ["'K1'!B4:B4", "'K1'!B4"],
  ])('has one canonical form: %s is %s', (text, canonical) => {
    const reference = readReference(text);
    expect(reference && referenceName(reference)).toBe(canonical);
  });

  it('can be fixed against moving', () => {
    const reference = readReference("'R2 D2'!A3:C7");
    expect(reference && fixedReferenceName(reference)).toBe("'R2 D2'!$A$3:$C$7");
  });

  it.each(['B4', "Kettle'!B4", 'Kettle!', '!B4', 'Kettle!B4:C5:D6', 'Kettle!A:B'])(
    'on a sheet is not read from %s',
    (text) => expect(readReference(text)).toBeNull(),
  );

  it('is told from a name', () => {
    expect(['K1', 'abc123', 'R1C1', 'rc', 'R2c'].filter((word) => !looksLikeCell(word))).toEqual([]);
    expect(['K_1', 'Keq', 'acid', 'rate1'].filter(looksLikeCell)).toEqual([]);
  });
});
