import { ESLint } from 'eslint';
import tseslint from 'typescript-eslint';
import { describe, expect, it } from 'vitest';
import { root } from '../../scripts/root.mjs';

/** Without the rules that need types: none of those below does, and loading the types takes long. */
const eslint = new ESLint({ cwd: root, overrideConfig: [tseslint.configs.disableTypeChecked] });

/** The rules that the text breaks when it stands in this file. */
async function broken(path: string, text: string): Promise<string[]> {
  const results = await eslint.lintText(text, { filePath: `${root}/${path}` });
  return results.flatMap(({ messages }) => messages).map(({ ruleId, message }) => `${ruleId}: ${message}`);
}

describe('the lint rules of functions/', { timeout: 30_000 }, () => {
  it.each([
    ['Math.pow(2, 0.5)', /Math\.pow differs in the last bit between versions of Node/],
    ['2 ** 0.5', /\*\* differs in the last bit between versions of Node/],
    ['Math.random()', /same answer for the same arguments/],
    ['Date.now()', /same answer for the same arguments/],
    ["Number(process.env['A'])", /same answer for the same arguments/],
    ['Number(console.log(1))', /same answer for the same arguments/],
  ])('refuse %s and say why', async (expression, reason) => {
    const messages = await broken('functions/errors.ts', `export const value: number = ${expression};\n`);
    expect(messages.join('\n')).toMatch(reason);
  });

  it('refuse any', async () => {
    const messages = await broken(
      'functions/errors.ts',
      'export function f(value: any): void {\n  void value;\n}\n',
    );
    expect(messages.join('\n')).toContain('no-explicit-any');
  });

  it('let a script use the clock', async () => {
    expect(await broken('scripts/layers.ts', 'export const value: number = Date.now() ** 2;\n')).toEqual([]);
  });
});
