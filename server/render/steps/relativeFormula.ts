/** A formula with its relative references written as distances, so that filled-down copies are alike. */
import { readWrittenCell, splitSheet } from '../../workbook/address.ts';
import { formulaTokens, type Token } from '../../workbook/formulaTokens.ts';
import type { PlacedFormula } from './placedFormula.ts';

export function relativeFormula({ formula, fills }: PlacedFormula): string {
  return formulaTokens(formula.formula)
    .map((token) => relative(token, fills.firstRow, fills.firstColumn))
    .join('');
}

function relative(token: Token, row: number, column: number): string {
  if (token.kind !== 'cell') return token.text;
  const { sheet, rest } = splitSheet(token.text);
  const cell = readWrittenCell(rest);
  if (cell === null) return token.text;
  const rowPart = cell.isRowFixed ? `${cell.row}` : `[${cell.row - row}]`;
  const columnPart = cell.isColumnFixed ? `${cell.column}` : `[${cell.column - column}]`;
  return `${sheet ?? ''}!R${rowPart}C${columnPart}`;
}
