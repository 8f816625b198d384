/** The published JSON Schema of a text workbook, from the schema that its reader uses. */
import { z } from 'zod';
import { workbookDocument } from '../../server/workbook/documentSchema.ts';
import type { GeneratedFile } from '../generated.ts';

export function files(): GeneratedFile[] {
  const { $schema, ...schema } = z.toJSONSchema(workbookDocument, { target: 'draft-2020-12' });
  const text = JSON.stringify(
    {
      $comment: 'Generated from documentSchema.ts by `npm run generate`.',
      $schema,
      title: 'A text workbook of Evenkeel',
      ...schema,
    },
    null,
    2,
  );
  return [{ path: 'server/workbook/workbook.schema.json', text: `${text}\n` }];
}
