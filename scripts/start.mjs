/**
 * `npm start`: sets up what is missing, evaluates every sample workbook and prints a line for each,
 * then serves them. Arguments after `--` go to `evenkeel serve`.
 *
 * It serves even where a sample fails, because the page shows why; it then ends with exit code 1.
 */
import { spawn, spawnSync } from 'node:child_process';
import { readdirSync } from 'node:fs';
import { root } from './root.mjs';
import { sampleLine } from './sampleLine.mjs';
import { setUp } from './setUp.mjs';

const COMMAND_LINE = `${root}/dist/cli.js`;
const SAMPLES = `${root}/workbook-samples`;
/** What the server ends with when it was stopped by Ctrl-C. */
const INTERRUPTED = 130;

await setUp();
const areGood = readdirSync(SAMPLES)
  .filter((name) => name.endsWith('.yaml'))
  .map((name) => showSample(name));
serve(areGood.every(Boolean));

/**
 * @param {string} name
 * @returns {boolean} whether the sample was evaluated and all of its checks passed
 */
function showSample(name) {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    [COMMAND_LINE, 'evaluate', `${SAMPLES}/${name}`, '--json'],
    { encoding: 'utf8', maxBuffer: Infinity },
  );
  const wasEvaluated = status === 0 || status === 1;
  console.log(wasEvaluated ? sampleLine(name, JSON.parse(stdout)) : `${name}: could not be evaluated`);
  if (status !== 0) process.stderr.write(stderr);
  return status === 0;
}

/** @param {boolean} isGood */
function serve(isGood) {
  const server = spawn(process.execPath, [COMMAND_LINE, 'serve', ...process.argv.slice(2)], {
    stdio: 'inherit',
  });
  // Ctrl-C reaches the server by itself; a signal sent to this process alone is passed on.
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM']))
    process.on(signal, () => server.kill(signal));
  // Ending the server is how this ends; npm would call its 130 for an interruption a failure.
  server.on('exit', (code) => process.exit(isGood && (code === 0 || code === INTERRUPTED) ? 0 : 1));
}
