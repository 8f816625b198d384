import type { FormulaCell } from '../../evaluation.ts';
import type { Reference } from '../../workbook/address.ts';

/** A formula with the cells that its answer fills. */
export interface PlacedFormula {
  readonly address: string;
  readonly fills: Reference;
  readonly formula: FormulaCell;
}
