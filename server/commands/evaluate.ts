import { createColors } from 'picocolors';
import { save } from '../files/save.ts';
import { answerText } from './answerText.ts';
import { writerFor } from './endings.ts';
import { evaluated, type EvaluatingOptions, exitCodeOf } from './evaluation.ts';
import { resultJson } from './resultJson.ts';
import type { Surroundings } from './surroundings.ts';

export interface EvaluateOptions extends EvaluatingOptions {
  readonly cells?: boolean;
  readonly json?: boolean;
  readonly save?: string;
}

/** `evenkeel evaluate`: prints what a workbook answers, and keeps it where asked. */
export async function evaluate(
  file: string,
  options: EvaluateOptions,
  surroundings: Surroundings,
): Promise<number> {
  const { cells = false, json = false, save: kept } = options;
  // A name that cannot be written is to be known before the work, not after.
  const write = kept === undefined ? null : writerFor(kept, ['.html', '.json']);
  const result = await evaluated(file, options, surroundings);
  if (kept !== undefined && write !== null) {
    await save(kept, await write(result.evaluation));
    surroundings.stderr.write(`Saved ${kept}\n`);
  }
  surroundings.stdout.write(
    json
      ? resultJson(result, cells)
      : answerText(result, { cells, colors: createColors(isColored(surroundings)) }),
  );
  return exitCodeOf(result.evaluation);
}

/** On a terminal, unless the person wants none (no-color.org). */
function isColored({ stdout }: Surroundings): boolean {
  return stdout.isTTY === true && !process.env.NO_COLOR && process.env.TERM !== 'dumb';
}
