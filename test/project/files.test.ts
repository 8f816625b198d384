import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { root } from '../../scripts/root.mjs';

const FOLDERS = ['functions', 'server', 'scripts', 'test', 'workbook-samples', '.ci'];
const files = [
  ...readdirSync(root).filter((name) => statSync(join(root, name)).isFile()),
  ...FOLDERS.flatMap((folder) =>
    readdirSync(join(root, folder), { recursive: true }).map((name) => join(folder, String(name))),
  ),
].filter((path) => path !== 'package-lock.json' && statSync(join(root, path)).isFile());
const texts = new Map(files.map((path) => [path, readFileSync(join(root, path), 'utf8')]));

describe('the files of the project', () => {
  it('are found', () => {
    expect([...texts.keys()]).toEqual(
      expect.arrayContaining(['package.json', 'functions/errors.ts', '.ci/run']),
    );
  });

  // The brackets keep this file from finding itself.
  it.each([
    ['a path of one machine', /\/(wor[k]|hom[e]|root|User[s])\/\w|\/tm[p]\/\w/],
    ['the address of a package registry', /registr[y]\.(npmjs|yarnpkg)|"resolve[d]":/],
    ['something left open', /\b(TOD[O]|FIXM[E]|XX[X])\b/],
  ])('do not hold %s', (_, pattern) => {
    expect(findings(pattern)).toEqual([]);
  });

  it('leave no test out', () => {
    expect(findings(/\b(it|test|describe)[.](only|skip|todo|fails)\b/)).toEqual([]);
  });

  it('include the text of the licence that the package names', () => {
    const { license } = JSON.parse(texts.get('package.json') ?? '') as { license: string };
    expect(license).toBe('GPL-3.0-only');
    expect(texts.get('LICENSE')).toMatch(/^\s*GNU GENERAL PUBLIC LICENSE\s+Version 3, 29 June 2007/);
  });

  it('name no file in package.json that is missing, but for what is built', () => {
    const { files: published } = JSON.parse(texts.get('package.json') ?? '') as { files: string[] };
    const missing = published.filter((path) => path !== 'dist' && !existsSync(join(root, path)));
    expect(missing).toEqual([]);
  });
});

/** Where the pattern stands, as `file:line: text`. */
function findings(pattern: RegExp): string[] {
  return [...texts].flatMap(([path, text]) =>
    text
      .split('\n')
      .flatMap((line, index) => (pattern.test(line) ? [`${path}:${index + 1}: ${line.trim()}`] : [])),
  );
}
