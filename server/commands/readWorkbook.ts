import { createReadStream } from 'node:fs';
import { basename } from 'node:path';
import type { Readable } from 'node:stream';
import { systemReason } from '../files/reasons.ts';
import { DEFAULT_TIME_LIMIT_SECONDS, withTimeLimit } from '../engine/timeLimit.ts';
import { serverError } from '../problems.ts';
import { unusableFile } from '../workbook/fileProblems.ts';
import type { Workbook } from '../workbook/model.ts';
import { MAX_WORKBOOK_BYTES, readYamlWorkbook } from '../workbook/yaml.ts';

/**
 * The workbook in a file, or on standard input for `-`.
 *
 * Messages name the file as the person did; the workbook keeps its name without the folder, so that
 * what is made of it does not depend on where it lay.
 *
 * Errors: `file-unreadable`, `time-limit` for a text that takes too long to read, and UnusableWorkbook with everything that is wrong in the file.
 */
export async function readWorkbook(
  file: string,
  stdin: Readable,
  timeLimitSeconds = DEFAULT_TIME_LIMIT_SECONDS,
): Promise<Workbook> {
  const bytes = await bytesOf(file === '-' ? stdin : createReadStream(file), file);
  const workbook = withTimeLimit(timeLimitSeconds, file, () => readYamlWorkbook(bytes, file));
  return { ...workbook, file: basename(file) };
}

/** Reads no further than a workbook may be long: a pipe need not end. */
async function bytesOf(stream: Readable, file: string): Promise<Buffer> {
  const chunks: Buffer[] = [];
  let size = 0;
  try {
    for await (const chunk of stream as AsyncIterable<Buffer>) {
      chunks.push(chunk);
      size += chunk.length;
      if (size > MAX_WORKBOOK_BYTES) break;
    }
  } catch (thrown) {
    throw serverError('file-unreadable', { file, reason: systemReason(thrown) });
  }
  if (size <= MAX_WORKBOOK_BYTES) return Buffer.concat(chunks);
  const details = { size: `more than ${MAX_WORKBOOK_BYTES}`, limit: MAX_WORKBOOK_BYTES };
  throw unusableFile(file, serverError('workbook-too-large', details));
}
