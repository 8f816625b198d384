/** More changes than this make it another word. */
const MOST_CHANGES = 2;

/**
 * The spelling that a mistyped text is nearest to: the same but for capitals, or else within two
 * inserted, dropped or exchanged characters and less than half of its length; null where none is.
 */
export function nearestSpelling(text: string, spellings: Iterable<string>): string | null {
  let nearest: string | null = null;
  let fewest = Math.min(MOST_CHANGES, (text.length - 1) / 2) + 1 / 2;
  for (const spelling of spellings) {
    if (spelling.toLowerCase() === text.toLowerCase()) return spelling;
    if (Math.abs(spelling.length - text.length) > MOST_CHANGES) continue;
    const changes = editDistance(text, spelling);
    if (changes < fewest) [nearest, fewest] = [spelling, changes];
  }
  return nearest;
}

/** Levenshtein's distance, one row of its table at a time. */
function editDistance(a: string, b: string): number {
  let row = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i += 1) {
    const next = [i];
    for (let j = 1; j <= b.length; j += 1) {
      const exchanged = row[j - 1]! + (a[i - 1] === b[j - 1] ? 0 : 1);
      next.push(Math.min(exchanged, row[j]! + 1, next[j - 1]! + 1));
    }
    row = next;
  }
  return row[b.length]!;
}
