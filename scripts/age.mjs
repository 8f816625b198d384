/** Which files are newer than which: the only test by which the set-up decides to do something. */
import { existsSync, readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';

/**
 * Whether the target is missing, or older than any of the sources. A folder counts with all that it
 * holds, and with itself, so that a deleted file shows.
 *
 * @param {string} target
 * @param {readonly string[]} sources those that do not exist are passed over
 */
export function isStale(target, sources) {
  return !existsSync(target) || sources.some((source) => newestIn(source) > statSync(target).mtimeMs);
}

/**
 * @param {string} path
 * @returns {number} milliseconds since 1970; 0 where nothing is there
 */
function newestIn(path) {
  const stats = statSync(path, { throwIfNoEntry: false });
  if (stats === undefined) return 0;
  if (!stats.isDirectory()) return stats.mtimeMs;
  return Math.max(stats.mtimeMs, ...readdirSync(path).map((name) => newestIn(join(path, name))));
}
