import { extname } from 'node:path';
import { Worker } from 'node:worker_threads';
import { InputError } from '../../functions/errors.ts';
import type { Given } from '../engine/host.ts';
import type { Evaluation } from '../evaluation.ts';
import { serverError } from '../problems.ts';
import type { Workbook } from '../workbook/model.ts';

export interface ThreadSetup {
  readonly workbooks: ReadonlyMap<string, Workbook>;
  readonly ownFunctionsFile: string | null;
  readonly timeLimitSeconds: number;
}

export interface Job {
  readonly name: string;
  readonly given: Given;
}

export type Reply =
  | { readonly evaluation: Evaluation }
  | { readonly error: { readonly code: string; readonly message: string } };

/** One person asks, with a few pages open. */
const THREADS = 2;
const MOST_WAITING = 16;

/** The worker as a source, or in the bundle, where this module lies in a folder beside `http` as well. */
const WORKER_FILE = new URL(`../http/evaluationWorker${extname(import.meta.url)}`, import.meta.url);

/** A place for a thread, which is started when it is first needed and again after it broke down. */
interface Lane {
  worker: Worker | null;
  /** Whoever waits for the answer of the thread. */
  asker: { resolve: (reply: Reply) => void; reject: (fault: Error) => void } | null;
}

/** Evaluates on threads, each evaluation under the time limit. */
export class EvaluationThreads {
  readonly #setup: ThreadSetup;
  readonly #lanes: readonly Lane[] = Array.from({ length: THREADS }, () => ({ worker: null, asker: null }));
  readonly #free: Lane[] = [...this.#lanes];
  readonly #waiting: ((lane: Lane) => void)[] = [];

  constructor(setup: ThreadSetup) {
    this.#setup = setup;
  }

  /** Errors: `server-busy`, and those of the evaluation. */
  async evaluate(name: string, given: Given): Promise<Evaluation> {
    const lane = await this.#freeLane();
    try {
      const reply = await ask(lane, this.#setup, { name, given });
      if ('evaluation' in reply) return reply.evaluation;
      throw new InputError(reply.error.code, reply.error.message);
    } finally {
      const next = this.#waiting.shift();
      if (next === undefined) this.#free.push(lane);
      else next(lane);
    }
  }

  /** Ends at once; what was asked for is not answered any more. */
  async close(): Promise<void> {
    this.#waiting.length = 0;
    await Promise.all(this.#lanes.map(async ({ worker }) => worker?.terminate()));
  }

  async #freeLane(): Promise<Lane> {
    const free = this.#free.pop();
    if (free !== undefined) return free;
    if (this.#waiting.length >= MOST_WAITING) throw serverError('server-busy', { count: MOST_WAITING });
    return new Promise((resolve) => this.#waiting.push(resolve));
  }
}

function ask(lane: Lane, setup: ThreadSetup, job: Job): Promise<Reply> {
  return new Promise((resolve, reject) => {
    lane.asker = { resolve, reject };
    lane.worker ??= started(lane, setup);
    lane.worker.postMessage(job);
  });
}

function started(lane: Lane, setup: ThreadSetup): Worker {
  const brokenDown = (fault: Error): void => {
    lane.worker = null;
    lane.asker?.reject(fault);
  };
  return new Worker(WORKER_FILE, { workerData: setup })
    .on('message', (reply: Reply) => lane.asker?.resolve(reply))
    .on('error', brokenDown)
    .on('exit', () => brokenDown(new Error('the thread ended without an answer')));
}
