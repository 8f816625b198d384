/** What only a process of its own can show. */
import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { root } from '../../../scripts/root.mjs';
import { KETTLE, workbookText } from './runCommand.ts';

/** Some seconds of work that no memory is needed for. */
const LONG_WORK = '=SUMPRODUCT(A$1:A$400*TRANSPOSE(A$1:A$400))';

const children: ChildProcess[] = [];

function started(words: string[]): ChildProcess {
  const child = spawn(process.execPath, [`${root}/dist/cli.js`, ...words]);
  children.push(child);
  return child;
}

async function textOf(stream: NodeJS.ReadableStream | null): Promise<string> {
  let text = '';
  for await (const chunk of stream!) text += String(chunk);
  return text;
}

describe('the program', () => {
  let folder: string;
  beforeAll(() => (folder = mkdtempSync(join(tmpdir(), 'program-'))));
  afterAll(() => {
    for (const child of children) child.kill('SIGKILL');
    rmSync(folder, { recursive: true });
  });

  it('ends with the exit code of its command', async () => {
    const child = started(['evaluate', KETTLE, '--set', 'acid=-1']);
    const ended = once(child, 'exit');
    expect(await textOf(child.stderr)).toContain('outside its limits');
    expect((await ended)[0]).toBe(2);
  });

  it('ends quietly when nobody reads on', async () => {
    const child = started(['evaluate', KETTLE, '--json', '--cells']);
    child.stdout!.destroy();
    const ended = once(child, 'exit');
    expect(await textOf(child.stderr)).toBe('');
    expect(await ended).toEqual([0, null]);
  });

  it('ends with 130 when it is interrupted in the middle of an evaluation', async () => {
    const file = join(folder, 'long.yaml');
    writeFileSync(file, workbookText(`A1: "=SEQUENCE(400)"\n    B1:B2000: '${LONG_WORK}'`));
    const child = started(['evaluate', file, '--time-limit', '25']);
    const ended = once(child, 'exit');
    await new Promise((resolve) => setTimeout(resolve, 2000));
    expect(child.exitCode).toBeNull();
    child.kill('SIGINT');
    expect(await ended).toEqual([130, null]);
  });

  it('lets own functions import the package from whatever folder they lie in', async () => {
    const file = join(folder, 'plant.mjs');
    const parameters = "{ value: number('any number') }";
    const entry = `{ name: 'PLANT.HALF', summary: 'Half.', gives: 'a number', examples: [], parameters: ${parameters}, run: ({ value }) => ({ value: value / 2 }) }`;
    writeFileSync(
      file,
      `import { defineFunction, number } from 'evenkeel';\nexport const half = defineFunction(${entry});`,
    );
    const workbook = join(folder, 'half.yaml');
    writeFileSync(workbook, workbookText("A1: '=PLANT.HALF(84)'", 'outputs: { out: { cell: S!A1 } }\n'));
    expect(await textOf(started(['evaluate', workbook, '--functions', file]).stdout)).toContain('out  42');
  });

  it('serves on threads, so that a long evaluation holds up no other', async () => {
    const file = join(folder, 'bomb.yaml');
    writeFileSync(file, workbookText("A1: '=SUM(SEQUENCE(30000, 1000))'"));
    const child = started(['serve', file, KETTLE, '--port', '0', '--time-limit', '2']);
    const ended = once(child, 'exit');
    const [address] = (await once(child.stdout!, 'data')) as [Buffer];
    const at = (path: string, signal: AbortSignal | null = null) =>
      fetch(new URL(path, String(address).trim()), { signal });
    const order: string[] = [];
    const bomb = at('/sheets/bomb').then((response) => (order.push('bomb'), response));
    const kettle = at('/sheets/kettle').then((response) => (order.push('kettle'), response));
    expect([(await kettle).status, (await bomb).status]).toEqual([200, 422]);
    expect(order).toEqual(['kettle', 'bomb']);
    expect((await at('/sheets/bomb?x=1')).status).toBe(422);
    expect((await at('/sheets/kettle?acid=1')).status).toBe(200);
    // Two are evaluated and sixteen wait; the next one is sent away.
    const enough = new AbortController();
    const many = Array.from({ length: 19 }, () => at('/sheets/bomb', enough.signal));
    expect((await Promise.race(many)).status).toBe(503);
    enough.abort();
    await Promise.allSettled(many);
    child.kill('SIGTERM');
    expect(await ended).toEqual([0, null]);
  });

  it('says when its port is taken', async () => {
    const other = createServer().listen(0, '127.0.0.1');
    await once(other, 'listening');
    const { port } = other.address() as { port: number };
    const child = started(['serve', KETTLE, '--port', String(port)]);
    const ended = once(child, 'exit');
    expect(await textOf(child.stderr)).toContain(`port ${port} cannot be used: another program uses it`);
    expect((await ended)[0]).toBe(2);
    other.close();
  });
});
