/** Times pieces of work in turn, so that whatever else the machine does falls on all of them. */

const ROUNDS = 600;
const REPEATS = 1;

/** The shortest time of each, in nanoseconds for one run. */
export function fastestOf(works: readonly (() => number)[]): number[] {
  const best = works.map(() => Infinity);
  let sink = 0;
  for (let round = 0; round < ROUNDS; round++) {
    works.forEach((work, i) => {
      const start = process.hrtime.bigint();
      for (let repeat = 0; repeat < REPEATS; repeat++) sink += work();
      best[i] = Math.min(best[i]!, Number(process.hrtime.bigint() - start) / REPEATS);
    });
  }
  // used, so that the work cannot be left out
  if (Number.isNaN(sink)) throw new Error('invariant: a benchmark computes numbers');
  return best;
}
