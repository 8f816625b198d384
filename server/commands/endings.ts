/** The forms in which an evaluation can be kept, by the ending of the file's name. */
import { extname } from 'node:path';
import type { Evaluation } from '../evaluation.ts';
import { serverError } from '../problems.ts';

type Written = (evaluation: Evaluation) => string | Promise<string>;

const JSON_INDENT = 2;

export const WRITERS = {
  '.html': async (evaluation: Evaluation) => {
    const { renderReport } = await import('../render/report.ts');
    return renderReport(evaluation);
  },
  '.json': (evaluation: Evaluation) => `${JSON.stringify(evaluation, null, JSON_INDENT)}\n`,
} as const satisfies Record<string, Written>;

/** How to write a file of this name. Errors: `save-ending`. */
export function writerFor(file: string, endings: readonly (keyof typeof WRITERS)[]): Written {
  const ending = endings.find((each) => each === extname(file).toLowerCase());
  if (ending === undefined) throw serverError('save-ending', { file, endings: endings.join(' or ') });
  return WRITERS[ending];
}
