/**
 * What the heading of a labelled table says about the columns beneath it.
 */
import { inputError } from '../../errors.ts';
import type { CellScalar } from '../entry.ts';
import { describe } from '../parameters/describe.ts';

/** A heading that carries a unit of its own: `amount / kmol`, `value [bar]`. */
const UNIT_IN_HEADING = /[/[(,]/;
const EXPANDED = /^\s*expanded uncertainty\s*\(\s*k\s*=\s*(\d+(?:\.\d+)?)\s*\)\s*$/i;
const STANDARD = /^\s*standard uncertainty\s*$/i;

/**
 * What the uncertainties under a heading line are to be divided by: the k of `expanded uncertainty
 * (k=2)`, 1 under `standard uncertainty` or nothing.
 *
 * Errors: `heading-unit` for a unit in the heading, which would be read by people only;
 * `heading-uncertainty` for another word over the uncertainties.
 */
export function coverageFactorUnder(heading: readonly CellScalar[], argument: string): number {
  for (const cell of [heading[1], heading[2]]) {
    if (typeof cell === 'string' && UNIT_IN_HEADING.test(cell)) {
      throw inputError('heading-unit', { argument, given: describe(cell) });
    }
  }
  const uncertainty = heading[3] ?? '';
  if (uncertainty === '') return 1;
  const k = typeof uncertainty === 'string' ? Number(EXPANDED.exec(uncertainty)?.[1] ?? 0) : 0;
  if (k > 0) return k;
  if (typeof uncertainty === 'string' && STANDARD.test(uncertainty)) return 1;
  throw inputError('heading-uncertainty', { argument, given: describe(uncertainty) });
}
