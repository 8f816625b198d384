import { inputError } from '../../errors.ts';
import { linePlace } from '../reading/tableForm.ts';
import type { MatchedLines, InertLine } from './matchedLines.ts';
import { countsInMedium, type Medium } from './medium.ts';

/**
 * The inert lines that are mixed in the medium, where activities are fractions of all that is mixed.
 *
 * Errors: `amounts-twice` for a species that two of them name, and those of the species.
 */
export function mixedInert({ form, inert }: MatchedLines, medium: Medium): InertLine[] {
  const first = new Map<string, InertLine>();
  for (const line of inert) {
    const species = line.species();
    if (!countsInMedium(species, medium)) continue;
    const other = first.get(species.text);
    if (other !== undefined) {
      throw inputError('amounts-twice', {
        place: linePlace(form, form.lines[line.position]!),
        first: linePlace(form, form.lines[other.position]!),
      });
    }
    first.set(species.text, line);
  }
  return [...first.values()];
}
