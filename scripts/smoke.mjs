/**
 * Runs `npm start` as a person would, looks at what it prints, asks the server for its first page and
 * stops it. Ends with exit code 1 where anything of that is not as it should be.
 */
import assert from 'node:assert/strict';
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { readdirSync } from 'node:fs';
import { createInterface } from 'node:readline';
import { root } from './root.mjs';

/** Long enough for a build on a slow machine. */
const PATIENCE_MS = 300_000;

const started = spawn(process.execPath, [`${root}/scripts/start.mjs`, '--port', '0'], {
  stdio: ['ignore', 'pipe', 'inherit'],
  timeout: PATIENCE_MS,
});
try {
  const { sampleLines, address } = await readUntilAddress();
  const samples = readdirSync(`${root}/workbook-samples`).filter((name) => name.endsWith('.yaml'));
  assert.ok(samples.length > 0, 'there are samples');
  assert.equal(sampleLines.length, samples.length, 'npm start prints a line for each sample');
  for (const line of sampleLines) assert.match(line, /checks: (\d+) of \1 passed$/);
  const page = await fetch(address);
  assert.equal(page.status, 200, `GET ${address}`);
  assert.match(page.headers.get('content-type') ?? '', /^text\/html/);
} finally {
  started.kill('SIGTERM');
}
const [code] = await once(started, 'exit');
assert.equal(code, 0, 'the server stops when it is told to');

async function readUntilAddress() {
  const sampleLines = [];
  for await (const line of createInterface({ input: started.stdout })) {
    console.log(line);
    if (/^[\w-]+\.yaml: /.test(line)) sampleLines.push(line);
    const address = /http:\/\/127\.0\.0\.1:\d+\S*/.exec(line)?.[0];
    if (address) return { sampleLines, address };
  }
  throw new Error('npm start ended before it printed an address.');
}
