/** What `evenkeel evaluate` costs beside a bundled script that only imports the engine. */
import { spawnSync } from 'node:child_process';
import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build } from 'esbuild';
import { atMost, forComparison, type Row } from '../benchRow.ts';
import { root } from '../root.mjs';

/** Its 200 cases are worked five times for its checks: work, not start-up, so that the goal is not for it. */
const LOG = 'reactorLog.yaml';
/** Odd, so that the median is one of them. */
const RUNS = 11;

export async function rows(): Promise<Row[]> {
  const folder = mkdtempSync(join(tmpdir(), 'start-up-'));
  try {
    const engineOnly = join(folder, 'engineOnly.mjs');
    await bundleEngine(engineOnly);
    const samples = readdirSync(`${root}/workbook-samples`).filter((name) => name.endsWith('.yaml'));
    return samples.map((name) => {
      const sample = `${root}/workbook-samples/${name}`;
      const ratio = medianRatio([`${root}/dist/cli.js`, 'evaluate', sample, '--json'], [engineOnly]);
      const what = `evaluate ${name}, against importing the engine`;
      return name === LOG ? forComparison(what, ratio) : atMost(3, what, ratio);
    });
  } finally {
    rmSync(folder, { recursive: true });
  }
}

async function bundleEngine(outfile: string): Promise<void> {
  await build({
    stdin: { contents: "import 'hyperformula';", resolveDir: root },
    ignoreAnnotations: true,
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    outfile,
  });
}

/** The two take turns, so that a change of the machine's load meets both. */
function medianRatio(words: string[], against: string[]): number {
  const pairs = Array.from({ length: RUNS }, () => [timed(words), timed(against)] as const);
  return median(pairs.map(([ours]) => ours)) / median(pairs.map(([, theirs]) => theirs));
}

function timed(words: string[]): number {
  const begun = performance.now();
  const { status, stderr } = spawnSync(process.execPath, words, { encoding: 'utf8' });
  const took = performance.now() - begun;
  if (status !== 0) throw new Error(`${words.join(' ')} ended with ${status}: ${stderr}`);
  return took;
}

function median(values: number[]): number {
  return values.toSorted((a, b) => a - b)[(values.length - 1) / 2]!;
}
