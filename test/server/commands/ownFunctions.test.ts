import { createHash } from 'node:crypto';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { runCommand, workbookText } from './runCommand.ts';

/** Plain JavaScript, as a person without a package may write it. */
const entry = (name: string, more = '') => `{
  name: '${name}', summary: 'Twice a number.', gives: 'a number', examples: [],
  parameters: { value: { summary: 'a number', isOptional: false, read: (given) => Number(given) } },
  run: ({ value }) => ({ value: 2 * value }), ${more}
}`;

describe('a file of own functions', () => {
  let folder: string;
  beforeAll(() => (folder = mkdtempSync(join(tmpdir(), 'own-'))));
  afterAll(() => rmSync(folder, { recursive: true }));
  let count = 0;
  function fileOf(source: string, ending = 'mjs'): string {
    const file = join(folder, `case${(count += 1)}.${ending}`);
    writeFileSync(file, source);
    return file;
  }

  it('works in cells, and its digest is told', async () => {
    const file = fileOf(`export const two = ${entry('PLANT.TWICE')};`);
    const text = workbookText("A1: '=PLANT.TWICE(21)'", 'outputs: {answer: {cell: S!A1}}\n');
    const { exitCode, stdout } = await runCommand(['evaluate', '-', '--json', '--functions', file], text);
    expect(exitCode).toBe(0);
    const sha256 = createHash('sha256').update(readFileSync(file)).digest('hex');
    expect(JSON.parse(stdout)).toMatchObject({
      outputs: { answer: { value: 42 } },
      ownFunctions: { file, sha256, names: ['PLANT.TWICE'] },
    });
  });

  it('is listed with the others', async () => {
    const file = fileOf(`export const three = ${entry('PLANT.SECOND')}; export const alias = three;`);
    const { stdout } = await runCommand(['functions', 'PLANT', '--functions', file]);
    expect(stdout).toContain('PLANT.SECOND(value)\n\nTwice a number.');
  });

  it.each<[string, string, string]>([
    ['that exports none', 'export const pi = 3;', 'exports no function. Export what defineFunction gives'],
    ['that cannot be read as a module', 'export const =', 'cannot be loaded as a file of functions'],
    ['that throws', "throw new Error('of its own');", 'cannot be loaded as a file of functions: of its own'],
    [
      'with a name of ours',
      `export const a = ${entry('EXTENT.SOLVE')};`,
      'the function name EXTENT.SOLVE is taken',
    ],
    [
      'with a name twice',
      `export const a = ${entry('PLANT.A')}; export const b = ${entry('PLANT.A')};`,
      'the function name PLANT.A is taken',
    ],
    ['with a name of no family', `export const a = ${entry('twice')};`, 'the function a of'],
    ['without a summary', `export const a = ${entry('PLANT.A', 'summary: undefined')};`, 'has no summary'],
    ['without parameters', `export const a = ${entry('PLANT.A', 'parameters: null')};`, 'has no parameters'],
    [
      'with a parameter that is not read',
      `export const a = ${entry('PLANT.A', 'parameters: { x: 1 }')};`,
      'has a parameter that does not say how it is read',
    ],
    ['without gives', `export const a = ${entry('PLANT.A', 'gives: 1')};`, 'has no words for what it gives'],
    ['without examples', `export const a = ${entry('PLANT.A', 'examples: 1')};`, 'has no list of examples'],
    [
      'with a run that is none',
      `export const a = ${entry('PLANT.A', 'run: 1')};`,
      'has a run that is no function',
    ],
  ])('%s is refused', async (_, source, says) => {
    const { exitCode, stderr } = await runCommand(['functions', '--functions', fileOf(source)]);
    expect(stderr).toContain(says);
    expect(exitCode).toBe(2);
  });

  it('that is missing is refused', async () => {
    const { exitCode, stderr } = await runCommand(['functions', '--functions', join(folder, 'none.mjs')]);
    expect(stderr).toContain('none.mjs cannot be read: there is no such file');
    expect(exitCode).toBe(2);
  });
});
