import { describe, expect, it } from 'vitest';
import { catalogue } from '../../../functions/catalogue.ts';
import { runCommand } from './runCommand.ts';

describe('functions', () => {
  it('lists every function with its summary', async () => {
    const { exitCode, stdout } = await runCommand(['functions']);
    for (const { name, summary } of catalogue)
      expect(stdout).toMatch(new RegExp(`^${name} +${summary[0]}`, 'm'));
    expect(exitCode).toBe(0);
  });

  it('lists a family', async () => {
    const { stdout } = await runCommand(['functions', 'extent']);
    expect(stdout.split('\n').filter((line) => !line.startsWith('EXTENT.'))).toEqual(['']);
  });

  it('describes one with usage, arguments, examples and sources', async () => {
    const { stdout } = await runCommand(['functions', 'extent.solve']);
    expect(stdout).toMatch(/^EXTENT\.SOLVE\(equation, K, amounts, \[conditions\]\)\n/);
    expect(stdout).toContain('  conditions  Conditions table');
    expect(stdout).toContain('gives 0.5\n  (by hand: (2 x 0.5)^2 / (0.5 x 0.5) is 4)');
    expect(stdout).toContain('A1: species | amount | unit\n      N2(g) | 1 | mol');
  });

  it('gives them as JSON', async () => {
    const { stdout } = await runCommand(['functions', '--json']);
    const listed = JSON.parse(stdout) as { name: string; arguments: object[] }[];
    expect(listed.map(({ name }) => name)).toEqual(catalogue.map(({ name }) => name));
    expect(listed.find(({ name }) => name === 'REACTION.CHECK')?.arguments).toEqual([
      { name: 'equation', summary: expect.any(String) as string, isOptional: false, isRepeated: false },
    ]);
  });

  it('says what is nearest to an unknown name', async () => {
    const { exitCode, stderr } = await runCommand(['functions', 'EXTENT.SOLV']);
    expect(stderr).toBe('error: there is no function EXTENT.SOLV. Did you mean EXTENT.SOLVE?\n');
    expect(exitCode).toBe(2);
  });
});
