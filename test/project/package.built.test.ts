import { spawnSync } from 'node:child_process';
import {
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build } from 'esbuild';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { root } from '../../scripts/root.mjs';

/** What somebody writes who has the package from a registry and uses all three of its exports. */
const OUTSIDER = `
import * as engine from 'hyperformula';
import { defineFunction } from 'evenkeel';
import { registerEvenkeel } from 'evenkeel/plugin';
import { solveExtent } from 'evenkeel/equilibrium';

const double = defineFunction({
  name: 'SAMPLE.DOUBLE',
  summary: 'Twice a number.',
  parameters: { value: { summary: 'a number', isOptional: false, read: (given) => Number(given) } },
  gives: 'a number',
  examples: [],
  run: ({ value }) => ({ value: 2 * value }),
});
registerEvenkeel(engine, [double]);

const sheet = [['=SAMPLE.DOUBLE(21)', '=REACTION.CHECK("N2(g) + 3 H2(g) = 2 NH3(g)")']];
const built = engine.HyperFormula.buildFromArray(sheet, { licenseKey: 'gpl-v3' });
const { status, extent } = solveExtent({
  species: ['A', 'B'],
  stoichiometry: [-1, 1],
  feed: [1, 0],
  mixed: [true, true],
  activity: 'amount',
  lnScale: 0,
  inert: 0,
  lnK: 0,
});
console.log(JSON.stringify({ cells: built.getSheetValues(0), status, extent }));
`;

const COMPILER_OPTIONS = {
  module: 'nodenext',
  target: 'es2023',
  strict: true,
  types: [],
  skipLibCheck: false,
};

describe('the package as it is published', () => {
  let folder: string;
  let published: string;
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), 'package-'));
    published = join(folder, 'node_modules/evenkeel');
    mkdirSync(published, { recursive: true });
    const [{ filename }] = JSON.parse(
      run('npm', ['pack', '--json', '--silent', '--pack-destination', folder, root]),
    ) as [{ filename: string }];
    run('tar', ['-xzf', filename, '--strip-components=1', '-C', published]);
    const { dependencies } = manifest();
    for (const name of Object.keys(dependencies)) {
      symlinkSync(join(root, 'node_modules', name), join(folder, 'node_modules', name));
    }
    writeFileSync(join(folder, 'package.json'), JSON.stringify({ type: 'module' }));
    writeFileSync(join(folder, 'tsconfig.json'), JSON.stringify({ compilerOptions: COMPILER_OPTIONS }));
    writeFileSync(join(folder, 'outsider.ts'), OUTSIDER);
  });
  afterAll(() => rmSync(folder, { recursive: true }));

  it('compiles and runs in the project of an outsider', () => {
    run(process.execPath, [join(root, 'node_modules/typescript/bin/tsc'), '-p', folder]);
    expect(JSON.parse(run(process.execPath, ['outsider.js']))).toEqual({
      cells: [[42, true]],
      status: 'settled',
      // A = B with K = 1 stops half way.
      extent: expect.closeTo(0.5, 15) as number,
    });
  });

  it.each(['plugin', 'equilibrium'])('goes into a bundle for the browser: evenkeel/%s', async (name) => {
    const { errors, warnings } = await build({
      stdin: { contents: `export * from 'evenkeel/${name}';`, resolveDir: folder },
      bundle: true,
      platform: 'browser',
      format: 'esm',
      write: false,
      logLevel: 'silent',
    });
    expect([...errors, ...warnings]).toEqual([]);
  });

  it('has a command that runs', () => {
    const { bin, version } = manifest();
    expect(run(process.execPath, [join(published, bin.evenkeel), '--version']).trim()).toBe(version);
  });

  it('has the samples, the reference and the schemas, and neither tests nor sources', () => {
    const files = readdirSync(published, { recursive: true }).map(String);
    expect(files).toEqual(
      expect.arrayContaining([
        'LICENSE',
        'workbook-samples',
        'functions/REFERENCE.md',
        'server/evaluation.schema.json',
      ]),
    );
    expect(files.filter((file) => /(?<!\.d)\.ts$|^(test|scripts)\b/.test(file))).toEqual([]);
  });

  function manifest() {
    return JSON.parse(readFileSync(join(published, 'package.json'), 'utf8')) as {
      version: string;
      bin: { evenkeel: string };
      dependencies: Record<string, string>;
    };
  }

  /** What the program prints; where it fails, that is what the test shows. */
  function run(program: string, words: string[]): string {
    const { status, stdout, stderr } = spawnSync(program, words, { cwd: folder, encoding: 'utf8' });
    expect(status, stdout + stderr).toBe(0);
    return stdout;
  }
});
