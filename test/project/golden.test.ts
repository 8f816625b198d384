import { execFileSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { numbersChanged } from '../../scripts/golden/changelog.ts';
import { GOLDEN_PATH, goldenOf, unexplained, writeGolden } from '../../scripts/golden/file.ts';
import { checkHistory } from '../../scripts/golden/history.ts';
import { moved, type Results, resultsOf } from '../../scripts/golden/results.ts';

const SILENT = '# Changelog\n\n## Unreleased\n\n### Added\n\n- A thing.\n';
const SAID = `${SILENT}\n### Numbers changed\n\n- The extent of the kettle, by 1e-12: a better start.\n`;

describe('golden results', () => {
  it('name every output, check and cell by its address, and leave blanks out', () => {
    const results = resultsOf({
      outputs: { extent: { value: 1.5 }, profile: { value: [[1], ['trace']] } },
      sheets: { Kettle: [['label', null], [{ error: 'amount-negative', message: 'negative' }]] },
      checks: [{ found: { extent: 0.9 } }],
    });
    expect(results).toEqual({
      'output extent': 1.5,
      'output profile[0][0]': 1,
      'output profile[1][0]': 'trace',
      'check 1 extent': 0.9,
      'cell Kettle!A1': 'label',
      'cell Kettle!A2': { error: 'amount-negative' },
    });
  });

  it.each<[string, Results, Results]>([
    ['the last bit of a number', { 'cell A!A1': 0.3 }, { 'cell A!A1': 0.1 + 0.2 }],
    ['a number that becomes an error', { 'cell A!A1': 1 }, { 'cell A!A1': { error: 'blank' } }],
    ['another error', { 'cell A!A1': { error: 'blank' } }, { 'cell A!A1': { error: 'missing' } }],
    ['another word of an output', { 'output way': 'forward' }, { 'output way': 'reverse' }],
  ])('have moved with %s', (_, before, after) => {
    expect(moved(before, after)).toHaveLength(1);
  });

  it.each<[string, Results, Results]>([
    ['a new result', {}, { 'cell A!A1': 1 }],
    ['a result that is gone', { 'cell A!A1': 1 }, {}],
    ['a label that reads differently', { 'cell A!A1': 'Feed' }, { 'cell A!A1': 'Charge' }],
  ])('have not moved with %s', (_, before, after) => {
    expect(moved(before, after)).toEqual([]);
  });

  it('are not written anew where one moved and the changelog says nothing', () => {
    const before = goldenOf(kettle(1), SILENT);
    expect(unexplained(before, goldenOf(kettle(2), SILENT))).toEqual([
      'kettle.yaml: output extent: was 1, now 2',
    ]);
    expect(unexplained(before, goldenOf(kettle(2), SAID))).toEqual([]);
    expect(unexplained(before, goldenOf({ ...kettle(1), 'new.yaml': { 'output x': 3 } }, SILENT))).toEqual(
      [],
    );
  });
});

describe('the entries under "Numbers changed"', () => {
  it('are read from every release, each on one line', () => {
    const changelog = '## 2\n### Numbers changed\n\n- One\n  and a half.\n- Two.\n### Fixed\n- Not this.\n';
    expect(numbersChanged(`${changelog}## 1\n### Numbers changed\n- Three.\n`)).toEqual([
      'One and a half.',
      'Two.',
      'Three.',
    ]);
  });
});

describe('the history of the golden file', { timeout: 30_000 }, () => {
  let repository: string;
  beforeEach(() => {
    repository = mkdtempSync(join(tmpdir(), 'golden-'));
    mkdirSync(join(repository, 'test/golden'), { recursive: true });
    git('init', '--quiet');
    commit(1, SILENT);
  });
  afterEach(() => rmSync(repository, { recursive: true }));

  it('fails for a commit that moves a result in silence', () => {
    commit(2, SILENT);
    const { commits, unexplained } = checkHistory(repository);
    expect(commits).toBe(2);
    expect(unexplained).toEqual([
      expect.stringMatching(/^[0-9a-f]{40}: kettle\.yaml: output extent: was 1, now 2$/),
    ]);
  });

  it('passes when the commit, or one since the file was last written, adds an entry', () => {
    commit(2, SAID);
    commit(2, `${SAID}- Another.\n`);
    commit(3, `${SAID}- Another.\n- A third.\n`);
    expect(checkHistory(repository).unexplained).toEqual([]);
  });

  it('does not take an old entry for a new one', () => {
    commit(2, SAID);
    commit(3, SAID);
    expect(checkHistory(repository).unexplained).toHaveLength(1);
  });

  function commit(extent: number, changelog: string) {
    writeFileSync(join(repository, GOLDEN_PATH), writeGolden(goldenOf(kettle(extent), changelog)));
    writeFileSync(join(repository, 'CHANGELOG.md'), changelog);
    git('add', '--all');
    git(
      '-c',
      'user.name=test',
      '-c',
      'user.email=test@localhost',
      'commit',
      '--quiet',
      '--message',
      'change',
    );
  }

  function git(...words: string[]) {
    execFileSync('git', words, { cwd: repository });
  }
});

function kettle(extent: number) {
  return { 'kettle.yaml': { 'output extent': extent } };
}
