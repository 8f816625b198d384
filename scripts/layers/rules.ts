/** The table of layers as rules of dependency-cruiser. */
import type { IRegularForbiddenRuleType } from 'dependency-cruiser';
import { allowedFor, type Layer, LAYERS } from './table.ts';

const SOURCES = '^(functions|server)/';
/** Every kind of dependency that comes out of node_modules, declared or not. */
const FROM_NPM = 'node_modules/';

export const RULES: readonly IRegularForbiddenRuleType[] = [
  ...LAYERS.flatMap(rulesFor),
  rule('no-cycles', 'Modules that import one another in a circle cannot be read one at a time.', {
    from: {},
    to: { circular: true },
  }),
  rule('must-resolve', 'What is imported has to exist.', { from: {}, to: { couldNotResolve: true } }),
  rule(
    'engine-types-only',
    'The engine is handed to the plugin by its caller; only its types are imported.',
    {
      from: { path: pattern('functions/plugin.ts') },
      to: { path: `${FROM_NPM}hyperformula/`, dependencyTypesNot: ['type-only'] },
    },
  ),
  rule('units-end-in-cells', 'A solver is given numbers in the units that it names; cells convert.', {
    from: { path: '^functions/equilibrium/' },
    to: { path: '^functions/chemistry/units/' },
  }),
  rule('functions-are-pure', 'Nothing under functions/ touches a file, the network or the environment.', {
    from: { path: '^functions/' },
    to: { dependencyTypes: ['core'] },
  }),
];

function rulesFor(layer: Layer): IRegularForbiddenRuleType[] {
  const allowed = allowedFor(layer);
  const packages = layer.packages.map((name) => `${FROM_NPM}${name}/`);
  return [
    rule(`${layer.name}-layers`, `${layer.path} may import ${allowed.map(({ name }) => name).join(', ')}.`, {
      from: { path: pattern(layer.path) },
      to: { path: SOURCES, pathNot: allowed.map(({ path }) => pattern(path)) },
    }),
    rule(`${layer.name}-packages`, `${layer.path} may use ${layer.packages.join(', ') || 'no package'}.`, {
      from: { path: pattern(layer.path) },
      to: { path: FROM_NPM, ...(packages.length > 0 && { pathNot: packages }) },
    }),
  ];
}

function rule(
  name: string,
  comment: string,
  ends: Pick<IRegularForbiddenRuleType, 'from' | 'to'>,
): IRegularForbiddenRuleType {
  return { name, comment, severity: 'error', ...ends };
}

function pattern(path: string): string {
  return `^${path.replaceAll('.', '\\.')}${path.endsWith('/') ? '' : '$'}`;
}
