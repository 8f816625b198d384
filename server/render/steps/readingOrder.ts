/**
 * One fixed order to read a workbook's formulas in: what comes first is needed first.
 *
 * A step is numbered `level.place`: level 1 comes from typed cells alone, level 2 from level 1 and
 * typed cells, and so on; within a level the order is that of the sheets, rows and columns.
 */
import { readReference, type Reference } from '../../workbook/address.ts';
import { meeting } from './overlaps.ts';
import type { Run } from './runs.ts';

export interface Numbered {
  readonly number: string;
  readonly run: Run;
}

/** The runs, given in the order of their addresses, in reading order. */
export function inReadingOrder(runs: readonly Run[]): Numbered[] {
  const levels = levelsOf(runs, sourcesOf(runs));
  const placesTaken = new Map<number, number>();
  const numbered = runs.map((run) => {
    const level = levels.get(run) ?? 0;
    const place = (placesTaken.get(level) ?? 0) + 1;
    placesTaken.set(level, place);
    return { level, place, number: `${level}.${place}`, run };
  });
  return numbered.sort((a, b) => a.level - b.level || a.place - b.place);
}

/** What a formula reads, as references. */
export function referencesOf(comesFrom: readonly string[]): Reference[] {
  return comesFrom.flatMap((address) => readReference(address) ?? []);
}

function sourcesOf(runs: readonly Run[]): Map<Run, ReadonlySet<Run>> {
  const meets = meeting(runs);
  return new Map(
    runs.map((run) => {
      const addresses = new Set(run.formulas.flatMap(({ formula }) => formula.comesFrom));
      const sources = new Set(referencesOf([...addresses]).flatMap(meets));
      sources.delete(run);
      return [run, sources];
    }),
  );
}

/**
 * Rounds of removal: each round takes the runs whose sources all have a level. Where runs wait for
 * one another (two columns that read each other's row above), the first by address goes on alone.
 */
function levelsOf(runs: readonly Run[], sources: ReadonlyMap<Run, ReadonlySet<Run>>): Map<Run, number> {
  const levels = new Map<Run, number>();
  let waiting = [...runs];
  while (waiting.length > 0) {
    const ready = waiting.filter((run) =>
      [...(sources.get(run) ?? [])].every((source) => levels.has(source)),
    );
    const taken = ready.length > 0 ? ready : waiting.slice(0, 1);
    const found = taken.map((run) => 1 + highest([...(sources.get(run) ?? [])], levels));
    taken.forEach((run, index) => levels.set(run, found[index] ?? 1));
    waiting = waiting.filter((run) => !levels.has(run));
  }
  return levels;
}

function highest(sources: readonly Run[], levels: ReadonlyMap<Run, number>): number {
  return sources.reduce((level, source) => Math.max(level, levels.get(source) ?? 0), 0);
}
