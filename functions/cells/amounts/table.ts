import { inputError } from '../../errors.ts';
import {
  type CellScalar,
  type CellTable,
  type CellValue,
  defineFunction,
  type Parameter,
  type Shape,
} from '../entry.ts';
import { optional } from '../parameters/optional.ts';

/** A row or a column of cells, with the way it lies. */
interface Strip {
  readonly lies: 'down' | 'across';
  readonly cells: readonly CellScalar[];
}

/** A row or a column; one cell is a strip of one. */
function strip(summary: string): Parameter<Strip> {
  return {
    summary,
    isOptional: false,
    read(given: CellValue, argument: string) {
      if (!Array.isArray(given)) return { lies: 'across', cells: [given as CellScalar] };
      const table = given as CellTable;
      if (table.length === 1) return { lies: 'across', cells: table[0]! };
      if (table[0]!.length === 1) return { lies: 'down', cells: table.map((row) => row[0]!) };
      throw inputError('table-strip', { argument, size: `${table.length} x ${table[0]!.length}` });
    },
  };
}

export const amountsTable = defineFunction({
  name: 'AMOUNTS.TABLE',
  summary: 'An amounts table from a row (or column) of species and a row (or column) of amounts.',
  parameters: {
    species: strip('Species, a row or a column.'),
    amounts: strip('Amounts, as many, lying the same way.'),
    units: optional(strip('One unit for all, or as many units.')),
    'standard uncertainties': optional(strip('One for all, or as many; the units must be given too.')),
  },
  gives: 'an amounts table that lies as its rows or columns lie',
  shape: ({ species, units, 'standard uncertainties': uncertainties }) =>
    tableShape(species!, units, uncertainties),
  examples: [
    {
      formula: '=AMOUNTS.TABLE({"A","B"}, {1,2}, "mol")',
      gives: [
        ['A', 'B'],
        [1, 2],
        ['mol', 'mol'],
      ],
      source: 'by hand',
    },
    {
      formula: '=EXTENT.SOLVE("A + B = 2 C", 4, AMOUNTS.TABLE({"C","A","B"}, {0,1,1}, "mol"))',
      gives: 0.5,
      within: 1e-14,
      source: 'by hand: (2 x 0.5)^2 / (0.5 x 0.5) is 4',
    },
  ],
  run({ species, amounts, units, 'standard uncertainties': uncertainties }) {
    const { lies, cells } = species;
    const lines = [
      cells,
      aligned(amounts, species, 'amounts', false),
      ...(units === undefined ? [] : [aligned(units, species, 'units', true)]),
      ...(uncertainties === undefined
        ? []
        : [aligned(uncertainties, species, 'standard uncertainties', true)]),
    ];
    if (uncertainties !== undefined && units === undefined) throw inputError('table-units', {});
    return { value: lies === 'across' ? lines : cells.map((_, i) => lines.map((line) => line[i]!)) };
  },
});

function tableShape(species: Shape, units: Shape | undefined, uncertainties: Shape | undefined): Shape {
  const width = 2 + (units === undefined ? 0 : 1) + (uncertainties === undefined ? 0 : 1);
  if (species.rows === 1) return { rows: width, columns: species.columns, lies: 'across' };
  return { rows: species.rows, columns: width, lies: 'down' };
}

function aligned(given: Strip, species: Strip, argument: string, mayBeOne: boolean): readonly CellScalar[] {
  const length = species.cells.length;
  if (mayBeOne && given.cells.length === 1) return new Array<CellScalar>(length).fill(given.cells[0]!);
  const isAligned = given.cells.length === length && (given.lies === species.lies || length === 1);
  if (isAligned) return given.cells;
  throw inputError('table-length', {
    argument,
    given: given.cells.length,
    wanted: length,
    lies: species.lies,
  });
}
