import { rename, rm, writeFile } from 'node:fs/promises';
import { basename, dirname, join } from 'node:path';
import { serverError } from '../problems.ts';
import { systemReason } from './reasons.ts';

/**
 * Writes a file whole or not at all: nobody meets half of it, and what stood there before stays until
 * the new text is on the disk.
 *
 * Errors: `save-failed`.
 *
 * ## Method
 * 1. Write a new file in the same folder, because only there a change of name is one step.
 * 2. Give it the name.
 */
export async function save(file: string, text: string): Promise<void> {
  const aside = join(dirname(file), `.${basename(file)}.${process.pid}.part`);
  try {
    await writeFile(aside, text, { flag: 'wx', flush: true });
    await rename(aside, file);
  } catch (thrown) {
    await rm(aside, { force: true });
    throw serverError('save-failed', { file, reason: systemReason(thrown) });
  }
}
