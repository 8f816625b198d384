/**
 * `npm run generate`: writes the files that are made from the sources. With `--check` it writes
 * nothing, and fails where one differs.
 */
import { writeFileSync } from 'node:fs';
import { generatedFiles, isOutOfDate } from './generated.ts';
import { root } from './root.mjs';

const files = await generatedFiles();
const outOfDate = files.filter(isOutOfDate);
if (process.argv.includes('--check')) {
  for (const { path } of outOfDate) console.error(`${path} is out of date: run npm run generate.`);
  if (outOfDate.length > 0) process.exitCode = 1;
} else {
  for (const { path, text } of outOfDate) writeFileSync(`${root}/${path}`, text);
}
console.log(`${files.length} generated files, ${outOfDate.length} were out of date.`);
