import { isInputError } from '../errors.ts';

/** Texts remembered at a time, unless said otherwise; a large workbook holds some hundreds. */
const CAPACITY = 2000;

/** Longer texts are read anew each time, so that a cache holds a few megabytes at the most. */
const LONGEST_REMEMBERED = 1000;

/**
 * The same reader, remembering what each text gave, an error of the input included.
 *
 * A cell function reads its equation in each of ten thousand cells. When the cache is full it is
 * emptied: it can only save time, never change a result.
 */
export function remember<Result extends object>(
  read: (text: string) => Result,
  capacity = CAPACITY,
): (text: string) => Result {
  const results = new Map<string, Result>();
  const errors = new Map<string, Error>();
  return (text) => {
    const known = results.get(text);
    if (known !== undefined) return known;
    const failure = errors.get(text);
    if (failure !== undefined) throw failure;
    if (text.length > LONGEST_REMEMBERED) return read(text);
    if (results.size + errors.size >= capacity) {
      results.clear();
      errors.clear();
    }
    try {
      const result = read(text);
      results.set(text, result);
      return result;
    } catch (thrown) {
      if (isInputError(thrown)) errors.set(text, thrown);
      throw thrown;
    }
  };
}
