/** Timing for ratios measured in one run. */

const USUAL_ROUNDS = 40;
const MILLISECONDS_PER_SECOND = 1000;

/**
 * The shortest time that each piece of work took, in seconds.
 *
 * They take turns, so that a change of the machine's load meets all of them; the shortest of many is
 * the one that was disturbed least.
 */
export function shortestSeconds<Name extends string>(
  works: Record<Name, () => void>,
  rounds = USUAL_ROUNDS,
): Record<Name, number> {
  const names = Object.keys(works) as Name[];
  const shortest = Object.fromEntries(names.map((name) => [name, Infinity])) as Record<Name, number>;
  for (let round = 0; round < rounds; round++) {
    for (const name of names) {
      const start = performance.now();
      works[name]();
      shortest[name] = Math.min(shortest[name], (performance.now() - start) / MILLISECONDS_PER_SECOND);
    }
  }
  return shortest;
}
