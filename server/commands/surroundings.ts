import type { Readable, Writable } from 'node:stream';

/** What a command meets; `process` is one. Data go to `stdout`, all else to `stderr`. */
export interface Surroundings {
  readonly stdin: Readable;
  readonly stdout: Writable & { readonly isTTY?: boolean };
  readonly stderr: Writable;
  on(signal: Signal, listener: (signal: Signal) => void): unknown;
  removeAllListeners(signal: Signal): unknown;
}

export type Signal = 'SIGINT' | 'SIGTERM';
