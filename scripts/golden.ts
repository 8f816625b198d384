/**
 * `npm run golden`: writes every sample's results bit for bit, and refuses where one moved that the
 * changelog does not speak of. With `--check` it writes nothing, and fails where a result differs
 * from the file or a commit moved one in silence.
 */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import {
  type Golden,
  goldenOf,
  GOLDEN_PATH,
  movedSamples,
  readGolden,
  unexplained,
  writeGolden,
} from './golden/file.ts';
import { checkHistory } from './golden/history.ts';
import { type EvaluationJson, type Results, resultsOf } from './golden/results.ts';
import { root } from './root.mjs';
import { setUp } from './setUp.mjs';

const GOLDEN_FILE = `${root}/${GOLDEN_PATH}`;
const SAMPLES = `${root}/workbook-samples`;

await setUp();
const current = goldenOf(evaluateSamples(), readFileSync(`${root}/CHANGELOG.md`, 'utf8'));
const kept = existsSync(GOLDEN_FILE) ? readGolden(readFileSync(GOLDEN_FILE, 'utf8')) : null;
if (process.argv.includes('--check')) check(kept, current);
else write(kept, current);

function evaluateSamples(): Record<string, Results> {
  const files = readdirSync(SAMPLES).filter((name) => name.endsWith('.yaml'));
  return Object.fromEntries(files.sort().map((file) => [file, evaluate(file)]));
}

function evaluate(file: string): Results {
  const words = [`${root}/dist/cli.js`, 'evaluate', `${SAMPLES}/${file}`, '--cells', '--json'];
  const { stdout, stderr } = spawnSync(process.execPath, words, { encoding: 'utf8', maxBuffer: Infinity });
  if (stdout === '') throw new Error(`${file} could not be evaluated: ${stderr}`);
  return resultsOf(JSON.parse(stdout) as EvaluationJson);
}

function check(before: Golden | null, after: Golden): void {
  const history = checkHistory(root);
  const isSame = JSON.stringify(before?.samples) === JSON.stringify(after.samples);
  complain([
    ...(before === null ? [] : movedSamples(before, after)),
    ...(isSame ? [] : [`${GOLDEN_PATH} is out of date or missing: run npm run golden.`]),
    ...history.unexplained.map(
      (line) => `moved without an entry under "Numbers changed" in CHANGELOG.md: ${line}`,
    ),
  ]);
  console.log(`Looked at: samples ${Object.keys(after.samples).length}, commits ${history.commits}.`);
}

function write(before: Golden | null, after: Golden): void {
  const lines = before === null ? [] : unexplained(before, after);
  if (lines.length > 0) {
    complain([...lines, 'Say under "Numbers changed" in CHANGELOG.md by how much and why; then run again.']);
    return;
  }
  mkdirSync(dirname(GOLDEN_FILE), { recursive: true });
  writeFileSync(GOLDEN_FILE, writeGolden(after));
}

function complain(complaints: string[]): void {
  for (const complaint of complaints) console.error(complaint);
  if (complaints.length > 0) process.exitCode = 1;
}
