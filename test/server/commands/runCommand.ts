/** Runs a command line in this process, and gives all that it wrote. */
import { EventEmitter } from 'node:events';
import { Readable, Writable } from 'node:stream';
import { run } from '../../../server/commands/run.ts';
import type { Surroundings } from '../../../server/commands/surroundings.ts';

export const KETTLE = `${import.meta.dirname}/kettle.yaml`;

export interface Ran {
  readonly exitCode: number;
  readonly stdout: string;
  readonly stderr: string;
}

export async function runCommand(words: readonly string[], stdin = ''): Promise<Ran> {
  const written = { stdout: '', stderr: '' };
  const into = (name: 'stdout' | 'stderr') =>
    new Writable({
      write(chunk: Buffer, _encoding, done) {
        written[name] += chunk.toString();
        done();
      },
    });
  const surroundings: Surroundings = Object.assign(new EventEmitter(), {
    stdin: Readable.from([Buffer.from(stdin)]),
    stdout: into('stdout'),
    stderr: into('stderr'),
  });
  return { exitCode: await run(words, surroundings), ...written };
}

/** A workbook of one sheet S from the lines of its cells, with further lines after it. */
export function workbookText(cells: string, rest = ''): string {
  return `workbook: 1\ntitle: Case\nsheets:\n  S:\n    ${cells}\n${rest}`;
}
