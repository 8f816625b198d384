/**
 * A reaction of which every question of medium can be asked: one A becomes two B.
 */
import type { CellTable } from '../../../functions/cells/entry.ts';

/** One mol (or mol/L) of A that turns into two of B. */
export const doubling = (
  tag: string,
  K: number,
  unit: string,
  conditions: CellTable,
  name = 'EXTENT.SOLVE',
  more = '',
) =>
  [
    `=${name}("A${tag} = 2 B${tag}", ${K}, A1:C2, E1:G${conditions.length}${more})`,
    {
      A1: [
        ['A', 1, unit],
        ['B', 0, unit],
      ] as CellTable,
      E1: conditions,
    },
  ] as const;
