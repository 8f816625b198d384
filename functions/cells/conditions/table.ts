import { inputError } from '../../errors.ts';
import { type CellScalar, type CellValue, defineFunction, type Parameter } from '../entry.ts';
import { describe } from '../parameters/describe.ts';
import { repeated } from '../parameters/optional.ts';
import { text } from '../parameters/text.ts';

/** Whatever one cell holds. */
function cell(summary: string): Parameter<CellScalar> {
  return {
    summary,
    isOptional: false,
    read(given: CellValue, argument: string) {
      if (!Array.isArray(given)) return given as CellScalar;
      throw inputError('argument-kind', { argument, given: describe(given), wanted: 'one cell' });
    },
  };
}

export const conditionsTable = defineFunction({
  name: 'CONDITIONS.TABLE',
  summary: 'A conditions table from triples of quantity, value and unit.',
  parameters: {
    quantity: repeated(text('Quantity, such as "temperature" or "temperature uncertainty".')),
    value: repeated(cell('Its value.')),
    unit: repeated(cell('Its unit; "" where it has none.')),
  },
  gives: 'a conditions table, one row for each triple',
  shape: (_, count) => ({ rows: Math.max(1, Math.floor(count / 3)), columns: 3 }),
  examples: [
    {
      formula: '=CONDITIONS.TABLE("temperature", 350, "K", "medium", "gas", "")',
      gives: [
        ['temperature', 350, 'K'],
        ['medium', 'gas', ''],
      ],
      source: 'by hand',
    },
  ],
  run: ({ quantity, value, unit }) => ({ value: quantity.map((name, i) => [name, value[i]!, unit[i]!]) }),
});
