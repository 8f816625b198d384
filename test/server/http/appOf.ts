/** The server over workbooks in this process: the requests are real, only the threads are left out. */
import { readFileSync } from 'node:fs';
import type { Express } from 'express';
import { evaluateWorkbook } from '../../../server/engine/evaluateWorkbook.ts';
import { createApp } from '../../../server/http/app.ts';
import { byName, type Serving } from '../../../server/http/serving.ts';
import type { Workbook } from '../../../server/workbook/model.ts';
import { readYamlWorkbook } from '../../../server/workbook/yaml.ts';
import { KETTLE } from '../commands/runCommand.ts';

export const kettle = readYamlWorkbook(readFileSync(KETTLE), 'kettle.yaml');

export function appOf(workbooks: readonly Workbook[], changes: Partial<Serving> = {}): Express {
  const named = byName(workbooks);
  return createApp(
    {
      workbooks: named,
      ownFunctions: null,
      evaluate: (name, given) =>
        Promise.resolve().then(() => evaluateWorkbook(named.get(name)!, { given, timeLimitSeconds: 0.5 })),
      ...changes,
    },
    () => undefined,
  );
}
