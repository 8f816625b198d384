/**
 * Values on their way between the engine and a cell function.
 */
import type { CellError } from 'hyperformula';
import type * as HyperFormulaModule from 'hyperformula';
import type { CellScalar, CellTable, CellValue, Shape } from '../cells/entry.ts';
import { inputError } from '../errors.ts';

/** What is needed of the engine: its module, or an object with these members. */
export type EngineModule = Pick<
  typeof HyperFormulaModule,
  | 'HyperFormula'
  | 'FunctionPlugin'
  | 'CellError'
  | 'ErrorType'
  | 'SimpleRangeValue'
  | 'EmptyValue'
  | 'ArraySize'
>;

/** The parts of the module as plain properties: those of its CommonJS build are worked out at each use. */
export function plainParts(engine: EngineModule): EngineModule {
  const { HyperFormula, FunctionPlugin, CellError, ErrorType, SimpleRangeValue, ArraySize } = engine;
  const EmptyValue: typeof engine.EmptyValue = engine.EmptyValue;
  return { HyperFormula, FunctionPlugin, CellError, ErrorType, SimpleRangeValue, EmptyValue, ArraySize };
}

/**
 * The value without the engine's own objects, or the first error in it: errors go on as they are, so
 * that their origin shows. Rows that hold no such object are handed on uncopied.
 */
export function readArgument(engine: EngineModule, value: unknown): CellValue | CellError {
  if (value instanceof engine.CellError) return value;
  if (!(value instanceof engine.SimpleRangeValue)) return cellScalar(engine, value);
  const rows: readonly (readonly unknown[])[] = value.data;
  let isPlain = true;
  for (const row of rows) {
    for (const cell of row) {
      if (typeof cell !== 'object' && typeof cell !== 'symbol') continue;
      if (cell instanceof engine.CellError) return cell;
      isPlain = false;
    }
  }
  const table = isPlain
    ? (rows as CellTable)
    : rows.map((row) => row.map((cell) => cellScalar(engine, cell)));
  return table.length === 1 && table[0]!.length === 1 ? table[0]![0]! : table;
}

function cellScalar(engine: EngineModule, value: unknown): CellScalar {
  if (value === engine.EmptyValue) return null;
  // Dates, percentages and currencies come as objects that hold their number.
  if (typeof value === 'object' && value !== null && 'val' in value) return value.val as number;
  return value as CellScalar;
}

/**
 * An answer as the engine takes it; a rectangle must have the size that was declared for it.
 *
 * Errors: `table-lies-otherwise`.
 */
export function engineValue(engine: EngineModule, value: CellValue, declared: () => Shape): unknown {
  if (!Array.isArray(value)) return engineScalar(engine, value as CellScalar);
  const rows = value as readonly (readonly CellScalar[])[];
  const shape = declared();
  if (rows.length !== shape.rows || rows[0]!.length !== shape.columns) {
    throw inputError('table-lies-otherwise', {
      found: `${rows.length} x ${rows[0]!.length}`,
      expected: `${shape.rows} x ${shape.columns}`,
    });
  }
  return engine.SimpleRangeValue.onlyValues(
    rows.map((row) => row.map((cell) => engineScalar(engine, cell))) as never,
  );
}

function engineScalar(engine: EngineModule, value: CellScalar): unknown {
  if (typeof value === 'number' && !Number.isFinite(value)) {
    throw new Error(`the answer ${value} is no finite number`);
  }
  return value ?? engine.EmptyValue;
}
