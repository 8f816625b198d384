/** The file of golden results, and when it may be written anew. */
import { createHash } from 'node:crypto';
import { numbersChanged } from './changelog.ts';
import { moved, type Results } from './results.ts';

export const GOLDEN_PATH = 'test/golden/samples.json';

export interface Golden {
  /** Digest of the changelog's entries under "Numbers changed" when the file was written. */
  readonly numbersChanged: string;
  /** By the name of the workbook file. */
  readonly samples: Readonly<Record<string, Results>>;
}

export function readGolden(text: string): Golden {
  return JSON.parse(text) as Golden;
}

export function writeGolden(golden: Golden): string {
  return `${JSON.stringify(golden, null, 1)}\n`;
}

/** The golden results that belong to these, with the changelog as it stands. */
export function goldenOf(samples: Golden['samples'], changelog: string): Golden {
  const entries = numbersChanged(changelog).join('\n');
  return { numbersChanged: createHash('sha256').update(entries).digest('hex'), samples };
}

/** What moved in the samples that both have, one line for each. */
export function movedSamples(before: Golden, after: Golden): string[] {
  return Object.entries(before.samples).flatMap(([file, results]) =>
    moved(results, after.samples[file] ?? {}).map((line) => `${file}: ${line}`),
  );
}

/** What moved without an entry that says so; the new results may be written only when it is nothing. */
export function unexplained(before: Golden, after: Golden): string[] {
  return before.numbersChanged === after.numbersChanged ? movedSamples(before, after) : [];
}
