import { save } from '../files/save.ts';
import { WRITERS, writerFor } from './endings.ts';
import { evaluated, type EvaluatingOptions, exitCodeOf } from './evaluation.ts';
import type { Surroundings } from './surroundings.ts';

export interface RenderOptions extends EvaluatingOptions {
  readonly save: string;
}

/** `evenkeel render`: writes a workbook's page. */
export async function render(
  file: string,
  options: RenderOptions,
  surroundings: Surroundings,
): Promise<number> {
  const isForStdout = options.save === '-';
  const write = isForStdout ? WRITERS['.html'] : writerFor(options.save, ['.html']);
  const { evaluation } = await evaluated(file, options, surroundings);
  const page = await write(evaluation);
  if (isForStdout) {
    surroundings.stdout.write(page);
  } else {
    await save(options.save, page);
    surroundings.stderr.write(`Saved ${options.save}\n`);
  }
  return exitCodeOf(evaluation);
}
