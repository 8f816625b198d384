import { equilibria } from './equilibria.ts';
import type { Evaluated } from './evaluation.ts';

const INDENT = 2;

/** The one object that `evaluate --json` prints: what was answered, without the evidence. */
export function resultJson({ given, evaluation, ownFunctions }: Evaluated, withCells: boolean): string {
  const { workbook, versions, instant, inputs, outputs, sheets, problems, checks } = evaluation;
  const result = {
    workbook: { title: workbook.title, sha256: workbook.sha256 },
    given,
    inputs: mapped(inputs, ({ cell, value, unit }) => ({ cell, value, unit })),
    outputs: mapped(outputs, ({ cell, value, unit }) => ({ cell, value, unit })),
    ...(withCells && { sheets }),
    problems,
    equilibria: equilibria(evaluation),
    checks: checks.map(({ passed, expected, found, source }) => ({ passed, expected, found, source })),
    versions,
    instant,
    ...(ownFunctions !== null && {
      ownFunctions: {
        file: ownFunctions.file,
        sha256: ownFunctions.sha256,
        names: ownFunctions.functions.map(({ name }) => name),
      },
    }),
  };
  return `${JSON.stringify(result, null, INDENT)}\n`;
}

function mapped<From, To>(record: Readonly<Record<string, From>>, change: (from: From) => To) {
  return Object.fromEntries(Object.entries(record).map(([name, from]) => [name, change(from)]));
}
