import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { isStale } from '../../scripts/age.mjs';
import { isAtLeast } from '../../scripts/setUp.mjs';
import { sampleLine } from '../../scripts/sampleLine.mjs';

describe('the set-up takes a target for stale', () => {
  let folder: string;
  const path = (name: string) => join(folder, name);
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'age-'));
    mkdirSync(path('sources/deep'), { recursive: true });
    writeAt('sources/deep/a.ts', 10);
    for (const name of ['sources/deep', 'sources']) utimesSync(path(name), 10, 10);
  });
  afterEach(() => rmSync(folder, { recursive: true }));

  it('when it is missing', () => {
    expect(isStale(path('target'), [path('sources')])).toBe(true);
  });

  it('when a source deep in a folder is newer, and not before', () => {
    writeAt('target', 20);
    expect(isStale(path('target'), [path('sources')])).toBe(false);
    writeAt('sources/deep/a.ts', 30);
    expect(isStale(path('target'), [path('sources')])).toBe(true);
  });

  it('when a source was deleted after it was made', () => {
    writeAt('target', 20);
    rmSync(path('sources/deep/a.ts'));
    expect(isStale(path('target'), [path('sources')])).toBe(true);
  });

  it('not for a source that does not exist', () => {
    writeAt('target', 20);
    expect(isStale(path('target'), [path('sources'), path('never')])).toBe(false);
  });

  function writeAt(name: string, seconds: number) {
    writeFileSync(path(name), '');
    utimesSync(path(name), seconds, seconds);
  }
});

describe('the version of Node', () => {
  it.each([
    ['20.19.0', true],
    ['20.20.2', true],
    ['22.1.0', true],
    ['100.0.0', true],
    ['20.9.0', false],
    ['18.20.8', false],
  ])('%s is enough: %s', (version, isEnough) => {
    expect(isAtLeast(version, '20.19')).toBe(isEnough);
  });
});

describe('the line for a sample', () => {
  it('shows numbers with their unit, words, array answers by their size, and the count of checks', () => {
    const line = sampleLine('kettle.yaml', {
      workbook: { title: 'Ester kettle' },
      outputs: {
        extent: { value: 1.5194981509883698, unit: 'mol' },
        way: { value: 'forward', unit: null },
        profile: { value: [[1], [2], [3]] },
        lost: { value: { error: 'blank', message: 'blank' } },
      },
      checks: [{ passed: true }, { passed: false }],
    });
    expect(line).toBe(
      'kettle.yaml: Ester kettle: extent 1.5195 mol, way forward, profile 3 x 1 cells, lost error blank; checks: 1 of 2 passed',
    );
  });
});
