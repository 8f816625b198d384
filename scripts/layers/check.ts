/** Cruises the sources below a folder and reports every import that the table of layers forbids. */
import { cruise, type ICruiseResult } from 'dependency-cruiser';
import { RULES } from './rules.ts';
import { LAYERS } from './table.ts';

export interface LayerReport {
  /** How many modules were read: 0 would mean that nothing was checked. */
  readonly modules: number;
  readonly violations: readonly string[];
}

export async function checkLayers(root: string): Promise<LayerReport> {
  const { output } = await cruise(['functions', 'server'], {
    baseDir: root,
    validate: true,
    ruleSet: { forbidden: [...RULES] },
    doNotFollow: { path: 'node_modules' },
    // Imports of types count as well.
    tsPreCompilationDeps: true,
    enhancedResolveOptions: { exportsFields: ['exports'], conditionNames: ['import', 'types'] },
  });
  if (typeof output === 'string') throw new Error('invariant: without a reporter the result is an object');
  const modules = output.modules
    .map(({ source }) => source)
    .filter((source) => /^(functions|server)\//.test(source));
  return { modules: modules.length, violations: [...forbiddenImports(output), ...strays(modules)] };
}

function forbiddenImports({ summary }: ICruiseResult): string[] {
  const reasons = new Map(RULES.map(({ name, comment }) => [name, comment]));
  return summary.violations.map(
    ({ from, to, rule, cycle }) =>
      `${[from, ...(cycle?.map(({ name }) => name) ?? [to])].join(' -> ')}: ${reasons.get(rule.name)} (${rule.name})`,
  );
}

/** A file outside every layer would be bound by no rule. */
function strays(modules: readonly string[]): string[] {
  return modules
    .filter(
      (source) =>
        !LAYERS.some(({ path }) => (path.endsWith('/') ? source.startsWith(path) : source === path)),
    )
    .map((source) => `${source}: belongs to no layer; give it one in scripts/layers/table.ts.`);
}
