/** What `evaluate` says of equilibria, errors, blanks and tolerances. */
import { describe, expect, it } from 'vitest';
import { runCommand, workbookText } from './runCommand.ts';

describe('evaluate', () => {
  it('tells beside an output, and in what needs attention, how its equilibrium ended', async () => {
    const solve = '\'=EXTENT.SOLVE("MX(s) = X(g)", 3, C1:D3, E1:G2)\'';
    const cells = `A1: ${solve}\n    A2: ${solve}\n    C1: [[species, amount], [MX(s), 1], [X(g), 0]]\n    E1: [[quantity, value, unit], [pressure, 1, bar]]`;
    const text = workbookText(cells, 'outputs: {out: {cell: S!A1}}\n');
    const { stdout } = await runCommand(['evaluate', '-'], text);
    expect(stdout).toContain('out  1; equilibrium exhausted (MX(s) ran out)\n');
    expect(stdout).toContain('Needs attention\n  S!A1, S!A2: EXTENT.SOLVE exhausted (MX(s) ran out)\n');
    const json = await runCommand(['evaluate', '-', '--json'], text);
    const call = { function: 'EXTENT.SOLVE', status: 'exhausted', reason: 'MX(s) ran out' };
    expect(JSON.parse(json.stdout)).toMatchObject({
      equilibria: [
        { cell: 'S!A1', ...call },
        { cell: 'S!A2', ...call },
      ],
    });
  });

  it('prints the error of an output once in full, and says where an output is blank', async () => {
    const outputs = 'outputs: {out: {cell: S!A1}, none: {cell: S!A9}}\n';
    const { stdout, exitCode } = await runCommand(['evaluate', '-'], workbookText("A1: '=1/0'", outputs));
    expect(stdout.match(/divides by zero/g)).toHaveLength(1);
    expect(stdout).toContain('S!A1: division-by-zero, told beside out');
    expect(stdout).toContain('none  blank, nothing to report');
    expect(exitCode).toBe(1);
    const blank = workbookText('A1: 1', 'outputs: {none: {cell: S!A9}}\n');
    expect((await runCommand(['evaluate', '-'], blank)).exitCode).toBe(0);
  });

  it('prints a share as one, and every digit that a tolerance needs', async () => {
    const checks =
      'outputs: {out: {cell: S!A1}}\nchecks: [{expect: {out: 1}, within: 50 %, source: typed}, {expect: {out: 1.1111111111}, within: 1.0e-9, source: typed}, {expect: {out: 2}, within: 0.1, source: typed}]\n';
    const { stdout } = await runCommand(['evaluate', '-'], workbookText("A1: '=10/9'", checks));
    expect(stdout).toContain('expected 1 within 50 %, found 1.11\n');
    expect(stdout).toContain('expected 1.1111111111 within 1e-9, found 1.1111111111\n');
    // a check that did not pass shows what was found whole
    expect(stdout).toContain('expected 2 within 0.1, found 1.1111111111111112\n');
  });
});
