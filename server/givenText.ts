/** Values of inputs as a person types them, on a command line or into a field. */
import { serverError } from './problems.ts';

const DECIMAL = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?$/i;
const TRUTH_VALUES = new Map([
  ['TRUE', true],
  ['FALSE', false],
]);

/** A number where it reads as one, TRUE or FALSE, and otherwise the text as it is; never a formula. */
export function typedValue(text: string): number | boolean | string {
  const trimmed = text.trim();
  const number = Number(trimmed);
  if (DECIMAL.test(trimmed) && Number.isFinite(number)) return number;
  return TRUTH_VALUES.get(trimmed.toUpperCase()) ?? text;
}

/** Errors: `given-twice`. */
export function givenByName(
  pairs: Iterable<readonly [name: string, text: string]>,
): Record<string, number | boolean | string> {
  const given = new Map<string, number | boolean | string>();
  for (const [name, text] of pairs) {
    if (given.has(name)) throw serverError('given-twice', { name });
    given.set(name, typedValue(text));
  }
  return Object.fromEntries(given);
}
