import { nearestSpelling } from '../functions/chemistry/units/nearestSpelling.ts';

/** `Did you mean gas?`, or the words there are, or that there are none. */
export function suggestion(word: string, known: readonly string[]): string {
  if (known.length === 0) return 'There are none.';
  const nearest = nearestSpelling(word, known);
  return nearest === null ? `There are: ${known.join(', ')}.` : `Did you mean ${nearest}?`;
}
