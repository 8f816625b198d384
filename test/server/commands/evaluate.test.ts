import { createHash } from 'node:crypto';
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { MAX_WORKBOOK_BYTES } from '../../../server/workbook/yaml.ts';
import { KETTLE, runCommand, workbookText } from './runCommand.ts';

/** The charge reacts until 3.1 x^2 - 20.9 x + 24.6 is 0: (2 - x)(3 - x) 4.1 = x (x + 0.4), by hand. */
const EXTENT = (20.9 - Math.sqrt(20.9 * 20.9 - 4 * 3.1 * 24.6)) / 6.2;

interface Result {
  outputs: Record<string, { value: unknown }>;
  sheets: Record<string, unknown[][]>;
  problems: { cell: string; code: string }[];
  given: unknown;
}

const parsed = (text: string) => JSON.parse(text) as Result;

describe('evaluate --json', () => {
  it('prints the one object of the format', async () => {
    const { exitCode, stdout, stderr } = await runCommand(['evaluate', KETTLE, '--json']);
    expect({ exitCode, stderr }).toEqual({ exitCode: 0, stderr: '' });
    const sha256 = createHash('sha256').update(readFileSync(KETTLE)).digest('hex');
    expect(JSON.parse(stdout)).toMatchObject({
      workbook: { title: 'Ester kettle, trial 7', sha256 },
      // The root loses two digits to the difference in the quadratic formula.
      outputs: { extent: { cell: 'Kettle!E3', value: expect.closeTo(EXTENT, 13) as number, unit: 'mol' } },
      problems: [],
      checks: [
        {
          passed: true,
          expected: { extent: 0.8727 },
          found: { extent: expect.closeTo(0.8727, 4) as number },
          source: 'by hand, the root of 3.1 x^2 - 16.8 x + 12.3',
        },
      ],
    });
    expect(JSON.parse(stdout)).not.toHaveProperty('sheets');
  });

  it('shows the sheets row by row from A1 with --cells, errors with code and message', async () => {
    const text = workbookText("B2: '=1/0'\n    A1: word\n    B1: TRUE");
    const { exitCode, stdout } = await runCommand(['evaluate', '-', '--json', '--cells'], text);
    expect(exitCode).toBe(0);
    const { sheets, problems } = parsed(stdout);
    const message =
      'the formula divides by zero. Check the cell that it divides by; a blank cell counts as 0.';
    expect(sheets).toEqual({
      S: [
        ['word', true],
        [null, { error: 'division-by-zero', message }],
      ],
    });
    expect(problems).toEqual([{ cell: 'S!B2', code: 'division-by-zero', message }]);
  });
});

describe('evaluate', () => {
  it('answers with unit and declared digits, checks, and what needs attention', async () => {
    const { stdout } = await runCommand(['evaluate', KETTLE]);
    expect(stdout).toBe(
      [
        'Ester kettle, trial 7',
        '',
        'extent  1.5195 mol',
        '',
        'check 1 with acid = 1: passed',
        '  extent: expected 0.8727 within 0.0001, found 0.87267',
        '  source: by hand, the root of 3.1 x^2 - 16.8 x + 12.3',
        '',
      ].join('\n'),
    );
    const needing = await runCommand(['evaluate', '-'], workbookText("A1: '=1/0'"));
    expect(needing.stdout).toContain('No outputs are declared.');
    expect(needing.stdout).toContain('Needs attention\n  S!A1: the formula divides by zero.');
  });

  it('takes other values for inputs, and says so', async () => {
    const { stdout } = await runCommand(['evaluate', KETTLE, '--set', 'acid=1']);
    expect(stdout).toContain('with acid = 1\n\nextent  0.87267 mol');
  });

  it('shows the rows of a range, and of a range in a check', async () => {
    const rest =
      'outputs:\n  both: {cell: "S!A1:B1", unit: mol}\nchecks:\n  - expect: {both: [[1, word]]}\n    within: 0.5\n    source: typed\n';
    const { stdout } = await runCommand(['evaluate', '-', '--cells'], workbookText('A1: [[1, word]]', rest));
    expect(stdout).toContain('both  S!A1:B1, in mol\n  1\tword\n');
    expect(stdout).toContain('both: expected [1, word] within 0.5, found [1, word]');
    expect(stdout).toContain('S:\n1\tword\n');
  });

  it.each([
    ['0 where only a cell that is no output fails', "A1: '=1/0'\n    A2: 1", 'S!A2', '', 0],
    ['1 where an output holds an error', "A1: '=1/0'", 'S!A1', '', 1],
    ['1 where a cell of an output holds an error', "A1: '=1/0'\n    A2: 1", 'S!A1:A2', '', 1],
    [
      '1 where a check does not pass',
      'A1: 2',
      'S!A1',
      'checks: [{expect: {out: 3}, within: 0.1, source: typed}]\n',
      1,
    ],
  ])('ends with %s', async (_, cells, output, checks, exitCode) => {
    const text = workbookText(cells, `outputs: {out: {cell: '${output}'}}\n${checks}`);
    const ran = await runCommand(['evaluate', '-'], text);
    expect(ran).toMatchObject({ exitCode, stderr: '' });
    if (checks !== '') expect(ran.stdout).toContain('check 1: NOT PASSED');
  });
});

describe('evaluate ends with 2, and says why, for', () => {
  const BOMB = workbookText("A1: '=SUM(SEQUENCE(30000, 1000))'");

  it.each<[string, string[], string, string]>([
    [
      'a file that is missing',
      ['nowhere.yaml'],
      '',
      'error: nowhere.yaml cannot be read: there is no such file',
    ],
    ['a folder', [import.meta.dirname], '', 'it is a folder'],
    ['an unknown input', [KETTLE, '--set', 'acd=1'], '', 'has no input acd. Did you mean acid?'],
    ['a value that is no number', [KETTLE, '--set', 'acid=1,5'], '', 'is a number, and 1,5 is none'],
    ['a formula as a value', [KETTLE, '--set', 'acid==1+1'], '', 'is a number, and =1+1 is none'],
    [
      'a value beyond the largest number',
      [KETTLE, '--set', 'acid=1e999'],
      '',
      'is a number, and 1e999 is none',
    ],
    ['a value outside its limits', [KETTLE, '--set', 'acid=-1'], '', 'outside its limits 0 to any'],
    ['--set without a value', [KETTLE, '--set', 'acid'], '', '--set acid is no name and value'],
    ['an input given twice', [KETTLE, '--set', 'acid=1', '--set', 'acid=2'], '', 'acid is given twice'],
    ['an unknown option', [KETTLE, '--jsno'], '', "unknown option '--jsno'\n(Did you mean --json?)"],
    ['no workbook', [], '', "missing required argument 'workbook'"],
    [
      'an ending that means nothing',
      [KETTLE, '--save', 'a.txt'],
      '',
      'a.txt does not end with .html or .json',
    ],
    ['a time limit of 0', [KETTLE, '--time-limit', '0'], '', 'Give seconds, above 0'],
    ['work that takes too long', ['-', '--time-limit', '0.2'], BOMB, '- was not evaluated within 0.2 s'],
    ['a file that is too long', ['-'], '#'.repeat(MAX_WORKBOOK_BYTES + 1), 'bytes, and the limit is'],
  ])('%s', async (_, words, stdin, says) => {
    const { exitCode, stdout, stderr } = await runCommand(['evaluate', ...words], stdin);
    expect(stderr).toContain(says);
    expect({ exitCode, stdout }).toEqual({ exitCode: 2, stdout: '' });
  });

  it('several mistakes in a workbook, one a line', async () => {
    const text = workbookText('A1: 1', 'inputs: {a: {cell: S!A9}}\noutputs: {b: {cell: T!A1}}\n');
    const { exitCode, stderr } = await runCommand(['evaluate', '-'], text);
    expect(exitCode).toBe(2);
    expect(stderr.trimEnd().split('\n')).toEqual([
      expect.stringMatching(/^-:6:\d+: /),
      expect.stringMatching(/^-:7:\d+: /),
    ]);
  });

  it('an unknown command', async () => {
    const { exitCode, stderr } = await runCommand(['evalute']);
    expect(stderr).toContain("unknown command 'evalute'\n(Did you mean evaluate?)");
    expect(exitCode).toBe(2);
  });
});

describe('what is saved', () => {
  let folder: string;
  beforeAll(() => (folder = mkdtempSync(join(tmpdir(), 'save-'))));
  afterAll(() => rmSync(folder, { recursive: true }));

  it('is the evaluation in .json, with its evidence', async () => {
    const file = join(folder, 'kettle.json');
    const { stderr } = await runCommand(['evaluate', KETTLE, '--save', file]);
    expect(stderr).toBe(`Saved ${file}\n`);
    expect(JSON.parse(readFileSync(file, 'utf8'))).toMatchObject({
      evaluation: 1,
      workbook: { file: 'kettle.yaml' },
      formulas: { 'Kettle!E3': { answers: [{ outcome: { status: 'settled' } }] } },
    });
  });

  it('is the page in .html, the same as render writes', async () => {
    const [saved, rendered] = [join(folder, 'a.html'), join(folder, 'b.html')];
    await runCommand(['evaluate', KETTLE, '--save', saved]);
    expect(await runCommand(['render', KETTLE, '--save', rendered])).toMatchObject({
      exitCode: 0,
      stdout: '',
    });
    const page = readFileSync(saved, 'utf8');
    expect(page).toContain('<h1>Ester kettle, trial 7</h1>');
    expect(readFileSync(rendered, 'utf8')).toBe(page);
    expect((await runCommand(['render', KETTLE, '--save', '-'])).stdout).toBe(page);
  });

  it('takes the place of the file before it, and leaves nothing beside it', async () => {
    const file = join(folder, 'again.json');
    writeFileSync(file, 'what was there');
    await runCommand(['evaluate', KETTLE, '--save', file]);
    expect(readFileSync(file, 'utf8')).toMatch(/^\{/);
    expect(readdirSync(folder).filter((name) => name.includes('part'))).toEqual([]);
  });

  it('cannot go into a folder that is missing', async () => {
    const { exitCode, stderr } = await runCommand([
      'evaluate',
      KETTLE,
      '--save',
      join(folder, 'no', 'a.json'),
    ]);
    expect(stderr).toContain('a.json cannot be written: there is no such file or folder');
    expect(exitCode).toBe(2);
  });

  it('is asked for by render, which writes only pages', async () => {
    expect((await runCommand(['render', KETTLE])).stderr).toContain("required option '--save <file>'");
    const { exitCode, stderr } = await runCommand(['render', KETTLE, '--save', 'a.json']);
    expect(stderr).toContain('a.json does not end with .html.');
    expect(exitCode).toBe(2);
  });
});
