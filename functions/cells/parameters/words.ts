import { inputError } from '../../errors.ts';
import type { CellTable, Parameter } from '../entry.ts';
import { describe } from './describe.ts';

/** One text, or a range of texts; blank cells of a range are passed over. */
export function words(summary: string): Parameter<readonly string[]> {
  return {
    summary,
    isOptional: false,
    read(given, argument) {
      const cells = Array.isArray(given) ? (given as CellTable).flat() : [given];
      return cells
        .filter((cell) => cell !== null && cell !== '')
        .map((cell) => {
          if (typeof cell === 'string') return cell.trim();
          throw inputError('argument-kind', {
            argument,
            given: describe(cell as number),
            wanted: 'a text, or a range of texts',
          });
        });
    },
  };
}
