import { readdir } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { DEFAULT_TIME_LIMIT_SECONDS } from '../engine/timeLimit.ts';
import { createApp } from '../http/app.ts';
import { EvaluationThreads } from '../http/evaluationThreads.ts';
import { addressOf, close, listen } from '../http/listen.ts';
import { byName } from '../http/serving.ts';
import { loadOwnFunctions } from '../ownFunctions.ts';
import { ExitCode } from './exitCode.ts';
import { readWorkbook } from './readWorkbook.ts';
import type { Signal, Surroundings } from './surroundings.ts';

export interface ServeOptions {
  readonly port: number;
  readonly functions?: string;
  /** In seconds. */
  readonly timeLimit?: number;
}

/** `evenkeel serve`: shows workbooks until it is told to stop. */
export async function serve(
  files: readonly string[],
  { port, functions, timeLimit = DEFAULT_TIME_LIMIT_SECONDS }: ServeOptions,
  surroundings: Surroundings,
): Promise<number> {
  const { stdin, stdout, stderr } = surroundings;
  const ownFunctions = functions === undefined ? null : await loadOwnFunctions(functions);
  const shown = files.length > 0 ? files : await sampleFiles();
  const workbooks = byName(await Promise.all(shown.map((file) => readWorkbook(file, stdin))));
  const threads = new EvaluationThreads({
    workbooks,
    ownFunctionsFile: functions ?? null,
    timeLimitSeconds: timeLimit,
  });
  const evaluate = threads.evaluate.bind(threads);
  const app = createApp({ workbooks, ownFunctions, evaluate }, (text) => stderr.write(`${text}\n`));
  const server = await listen(app, port);
  const told = stopSignal(surroundings);
  stderr.write(`Serving ${workbooks.size} workbooks to this computer; Ctrl-C stops it.\n`);
  stdout.write(`${addressOf(server)}\n`);
  const signal = await told;
  await close(server);
  await threads.close();
  return signal === 'SIGINT' ? ExitCode.interrupted : ExitCode.good;
}

async function sampleFiles(): Promise<string[]> {
  const root = dirname(createRequire(import.meta.url).resolve('evenkeel/package.json'));
  const folder = join(root, 'workbook-samples');
  const names = await readdir(folder);
  return names
    .filter((name) => name.endsWith('.yaml'))
    .sort()
    .map((name) => join(folder, name));
}

/** Takes the place of what would end the program at once; being told twice changes nothing. */
function stopSignal(surroundings: Surroundings): Promise<Signal> {
  return new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM'] as const) {
      surroundings.removeAllListeners(signal);
      surroundings.on(signal, resolve);
    }
  });
}
