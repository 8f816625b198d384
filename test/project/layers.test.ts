import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { checkLayers, type LayerReport } from '../../scripts/layers/check.ts';
import { root } from '../../scripts/root.mjs';

const folders: string[] = [];
afterAll(() => folders.forEach((folder) => rmSync(folder, { recursive: true })));

/** Checks a small project that holds just these files. */
async function check(files: Record<string, string>): Promise<LayerReport> {
  const folder = mkdtempSync(join(tmpdir(), 'layers-'));
  folders.push(folder);
  symlinkSync(join(root, 'node_modules'), join(folder, 'node_modules'));
  for (const name of ['functions', 'server']) mkdirSync(join(folder, name));
  for (const [path, text] of Object.entries(files)) {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), text);
  }
  return checkLayers(folder);
}

const LEAF = 'export const leaf = 1;\n';

describe('the layer check', { timeout: 30_000 }, () => {
  it('reads the modules of the project and finds nothing forbidden', async () => {
    const report = await checkLayers(root);
    expect(report.violations).toEqual([]);
    expect(report.modules).toBeGreaterThan(0);
  });

  it.each([
    ['functions/chemistry/a.ts', 'functions/numerics/leaf.ts'],
    ['functions/cells/reaction/a.ts', 'functions/numerics/leaf.ts'],
    ['functions/index.ts', 'functions/cells/leaf.ts'],
    ['server/render/report.ts', 'functions/equilibrium/leaf.ts'],
    ['server/http/app.ts', 'server/problems.ts'],
    ['server/commands/serve.ts', 'server/http/leaf.ts'],
  ])('lets %s import %s', async (from, to) => {
    const report = await check({ [from]: importing(from, to), [to]: LEAF });
    expect(report).toEqual({ modules: 2, violations: [] });
  });

  it.each([
    ['functions/numerics/a.ts', 'functions/chemistry/leaf.ts', 'numerics-layers'],
    ['functions/chemistry/a.ts', 'functions/equilibrium/leaf.ts', 'chemistry-layers'],
    ['functions/data/a.ts', 'functions/numerics/leaf.ts', 'data-layers'],
    ['functions/index.ts', 'functions/plugin.ts', 'library-layers'],
    ['functions/cells/a.ts', 'server/problems.ts', 'cells-layers'],
    ['functions/equilibrium/a.ts', 'functions/chemistry/units/leaf.ts', 'units-end-in-cells'],
    ['server/workbook/yaml.ts', 'server/evaluation.ts', 'workbook-layers'],
    ['server/render/report.ts', 'server/engine/host.ts', 'render-layers'],
    ['server/http/app.ts', 'server/commands/run.ts', 'http-layers'],
  ])('refuses that %s imports %s', async (from, to, rule) => {
    const { violations } = await check({ [from]: importing(from, to), [to]: LEAF });
    expect(violations).toEqual([expect.stringContaining(`${from} -> ${to}: `)]);
    expect(violations[0]).toContain(rule);
  });

  it('counts an import of types only', async () => {
    const { violations } = await check({
      'functions/numerics/a.ts': "import type { Leaf } from '../chemistry/leaf.ts';\nexport type A = Leaf;\n",
      'functions/chemistry/leaf.ts': 'export type Leaf = 1;\n',
    });
    expect(violations).toHaveLength(1);
  });

  it('prints the layers that are allowed', async () => {
    const from = 'functions/chemistry/a.ts';
    const to = 'functions/cells/leaf.ts';
    const { violations } = await check({ [from]: importing(from, to), [to]: LEAF });
    expect(violations[0]).toContain('functions/chemistry/ may import chemistry, numerics, data, errors');
  });

  it.each([
    ['numerics has no package', 'functions/numerics/a.ts', "import 'mathjs';", 'numerics-packages'],
    ['equilibrium has no package', 'functions/equilibrium/a.ts', "import 'mathjs';", 'equilibrium-packages'],
    ['cells do not know the engine', 'functions/cells/a.ts', "import 'hyperformula';", 'cells-packages'],
    ['the plugin imports only types', 'functions/plugin.ts', "import 'hyperformula';", 'engine-types-only'],
    ['functions touch no file', 'functions/chemistry/a.ts', "import 'node:fs';", 'functions-are-pure'],
    ['what is imported exists', 'functions/chemistry/a.ts', "import './gone.ts';", 'must-resolve'],
  ])('holds that %s', async (_, file, text, rule) => {
    const { violations } = await check({ [file]: text });
    expect(violations).toEqual([expect.stringContaining(`(${rule})`)]);
  });

  it('lets the plugin import the types of the engine, and the host the engine itself', async () => {
    const { violations } = await check({
      'functions/plugin.ts':
        "import type { HyperFormula } from 'hyperformula';\nexport type Engine = HyperFormula;\n",
      'server/engine/host.ts': "export { HyperFormula } from 'hyperformula';\n",
    });
    expect(violations).toEqual([]);
  });

  it('finds modules that import one another in a circle', async () => {
    const { violations } = await check({
      'functions/numerics/a.ts': "import './b.ts';\n",
      'functions/numerics/b.ts': "import './a.ts';\n",
    });
    expect(violations.join()).toContain('(no-cycles)');
  });

  it('finds a module that belongs to no layer', async () => {
    const { violations } = await check({ 'functions/helpers.ts': LEAF });
    expect(violations).toEqual([expect.stringContaining('functions/helpers.ts: belongs to no layer')]);
  });
});

/** A module at `from` that imports the one at `to`. */
function importing(from: string, to: string): string {
  return `import { leaf } from '${'../'.repeat(from.split('/').length - 1)}${to}';\nexport const own = leaf;\n`;
}
