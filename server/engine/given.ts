/**
 * Checks values for inputs before they are put into a workbook.
 */
import { suggestion } from '../nearest.ts';
import { serverError } from '../problems.ts';
import type { Workbook } from '../workbook/model.ts';
import type { Given } from './host.ts';

/** Errors: `given-unknown`, `given-kind` (no number for an input with limits or a unit), `given-limits`. */
export function checkGiven({ inputs }: Workbook, given: Given): void {
  for (const [name, value] of Object.entries(given)) {
    const input = inputs.find((candidate) => candidate.name === name);
    if (input === undefined) {
      throw serverError('given-unknown', {
        name,
        nearest: suggestion(
          name,
          inputs.map((known) => known.name),
        ),
      });
    }
    const { unit, min, max } = input;
    const isNumeric = unit !== null || min !== null || max !== null;
    if (isNumeric && (typeof value !== 'number' || !Number.isFinite(value))) {
      throw serverError('given-kind', { name, value: String(value) });
    }
    if (typeof value !== 'number') continue;
    if ((min !== null && value < min) || (max !== null && value > max)) {
      throw serverError('given-limits', { name, value, lowest: min ?? 'any', highest: max ?? 'any' });
    }
  }
}
