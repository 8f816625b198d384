/** What the README tells an analyst to type, typed. */
import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { root } from '../../scripts/root.mjs';

const README = readFileSync(`${root}/README.md`, 'utf8');
const OWN_FUNCTIONS = /```js\n(\/\/ plant\.mjs\n[^]*?)```/.exec(README)![1]!;

const BRINE = `workbook: 1
title: Brine
sheets:
  Tank:
    A1: '=PLANT.BRINE.DENSITY(0.2)'
outputs:
  density: {cell: Tank!A1, unit: kg/L}
checks:
  - expect: {density: 1.148}
    within: 1.0e-12
    source: by hand, 0.998 + 0.75 x 0.2
`;

let folder: string;
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'readme-'));
  writeFileSync(join(folder, 'plant.mjs'), OWN_FUNCTIONS);
  writeFileSync(join(folder, 'brine.yaml'), BRINE);
});
afterAll(() => rmSync(folder, { recursive: true }));

it('the own function of the README works in a workbook', () => {
  const words = [join(root, 'dist/cli.js'), 'evaluate', 'brine.yaml', '--functions', 'plant.mjs', '--json'];
  const { status, stdout, stderr } = spawnSync(process.execPath, words, { cwd: folder, encoding: 'utf8' });
  expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
  expect(JSON.parse(stdout)).toMatchObject({ checks: [{ passed: true }] });
});
