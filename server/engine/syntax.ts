/**
 * The only file that touches the engine's internals, for what it does not publish.
 */
import type { HyperFormula } from 'hyperformula';
import type { CellPlace } from '../../functions/plugin.ts';
import type { Area } from '../workbook/address.ts';

interface InternalVertex {
  readonly width?: number;
  readonly height?: number;
}
interface InternalGraph {
  getCell(place: CellPlace): InternalVertex | undefined;
}

/** The cells that the answer of the formula at a place takes up. */
export function answerArea(engine: HyperFormula, { sheet, row, col }: CellPlace): Area {
  const { dependencyGraph } = engine as unknown as { dependencyGraph: InternalGraph };
  const { width = 1, height = 1 } = dependencyGraph.getCell({ sheet, row, col }) ?? {};
  return { firstRow: row, firstColumn: col, lastRow: row + height - 1, lastColumn: col + width - 1 };
}
