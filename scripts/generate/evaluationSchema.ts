/** The published JSON Schema of an evaluation, from its type. */
import { createGenerator } from 'ts-json-schema-generator';
import type { GeneratedFile } from '../generated.ts';
import { root } from '../root.mjs';

export function files(): GeneratedFile[] {
  const schema = createGenerator({
    path: `${root}/server/evaluation.ts`,
    tsconfig: `${root}/tsconfig.json`,
    type: 'Evaluation',
    skipTypeCheck: true,
  }).createSchema('Evaluation');
  const text = JSON.stringify(
    { $comment: 'Generated from evaluation.ts by `npm run generate`.', ...schema },
    null,
    2,
  );
  return [{ path: 'server/evaluation.schema.json', text: `${text}\n` }];
}
