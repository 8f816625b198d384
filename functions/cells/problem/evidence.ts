/**
 * Evidence as fixed rows of item and value, or as one of the values.
 */
import { inputError } from '../../errors.ts';
import type { CellScalar, CellValue, Shape } from '../entry.ts';

type Items<Facts> = Readonly<Record<string, (facts: Facts) => CellScalar>>;

/** The size of the answer: one cell where one item is asked for. */
export function evidenceShape(items: Items<never>, item: Shape | undefined): Shape {
  return item === undefined ? { rows: Object.keys(items).length, columns: 2 } : { rows: 1, columns: 1 };
}

/** The rows, or the value of one item. Errors: `evidence-item` for a name that is none of them. */
export function evidenceTable<Facts>(items: Items<Facts>, item: string | undefined, facts: Facts): CellValue {
  if (item === undefined) return Object.entries(items).map(([name, value]) => [name, value(facts)]);
  if (Object.hasOwn(items, item)) return items[item]!(facts);
  throw inputError('evidence-item', { item, items: Object.keys(items).join(', ') });
}
