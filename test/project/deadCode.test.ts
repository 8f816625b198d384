import { execFileSync } from 'node:child_process';
import { copyFileSync, mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { root } from '../../scripts/root.mjs';

describe('the search for dead code', { timeout: 30_000 }, () => {
  let folder: string;
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), 'dead-code-'));
    for (const name of ['knip.json', 'tsconfig.json']) copyFileSync(join(root, name), join(folder, name));
    symlinkSync(join(root, 'node_modules'), join(folder, 'node_modules'));
    write('package.json', JSON.stringify({ name: 'seeded', type: 'module', dependencies: { mathjs: '*' } }));
    write('functions/index.ts', "export { used } from './numerics/used.ts';\n");
    write('functions/numerics/used.ts', 'export const used = 1;\nexport const unused = 2;\n');
    write('functions/numerics/unreached.ts', 'export const unreached = 3;\n');
  });
  afterAll(() => rmSync(folder, { recursive: true }));

  it('finds an unused export, a file that nothing reaches, and a package that nothing imports', () => {
    const report = execFileSync(
      process.execPath,
      [join(root, 'node_modules/knip/bin/knip.js'), '--reporter', 'compact', '--no-exit-code'],
      { cwd: folder, encoding: 'utf8' },
    );
    expect(report).toContain('functions/numerics/unreached.ts');
    expect(report).toMatch(/functions\/numerics\/used\.ts: unused$/m);
    expect(report).toMatch(/package\.json: mathjs$/m);
    expect(report).not.toContain('functions/index.ts');
  });

  function write(path: string, text: string) {
    mkdirSync(join(folder, path, '..'), { recursive: true });
    writeFileSync(join(folder, path), text);
  }
});
