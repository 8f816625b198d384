/**
 * Who may import whom. A layer may import itself, the layers that it stands on, and whatever those
 * stand on; nothing else. `packages` are those of npm that it may use.
 */
export interface Layer {
  readonly name: string;
  /** A folder, with a slash at its end, or one file. */
  readonly path: string;
  readonly standsOn: readonly string[];
  readonly packages: readonly string[];
}

const ENGINE = 'hyperformula';

/** The lowest first: a layer stands only on those above it in this list. */
export const LAYERS: readonly Layer[] = [
  layer('error table', 'functions/errorTable.ts', []),
  layer('error tables', 'functions/errorTables/', ['error table']),
  layer('errors', 'functions/errors.ts', ['error tables']),
  layer('numerics', 'functions/numerics/', ['errors']),
  layer('data', 'functions/data/', ['errors']),
  layer('chemistry', 'functions/chemistry/', ['numerics', 'data'], ['mathjs']),
  layer('equilibrium', 'functions/equilibrium/', ['chemistry']),
  layer('cells', 'functions/cells/', ['equilibrium'], ['mathjs']),
  layer('library', 'functions/index.ts', ['cells']),
  layer('catalogue', 'functions/catalogue.ts', ['cells']),
  layer('engine values', 'functions/plugin/', ['cells'], [ENGINE]),
  layer('plugin', 'functions/plugin.ts', ['catalogue', 'engine values'], [ENGINE]),

  layer('problem tables', 'server/problemTables/', ['error table']),
  layer('problems', 'server/problems.ts', ['errors', 'problem tables']),
  layer('nearest', 'server/nearest.ts', ['chemistry']),
  layer('workbook', 'server/workbook/', ['problems', 'nearest', 'equilibrium'], ['yaml', 'zod']),
  layer('evaluation', 'server/evaluation.ts', ['workbook']),
  layer('engine', 'server/engine/', ['evaluation', 'plugin'], [ENGINE]),
  layer('batch', 'server/batch/', ['engine']),
  layer('audit', 'server/audit/', ['evaluation']),
  layer('render', 'server/render/', ['evaluation'], ['d3-scale', 'd3-shape', 'temml']),
  layer('files', 'server/files/', ['problems']),
  layer('given text', 'server/givenText.ts', ['problems', 'nearest']),
  layer('own functions', 'server/ownFunctions.ts', ['files', 'engine']),
  layer(
    'http',
    'server/http/',
    ['batch', 'audit', 'render', 'given text', 'own functions'],
    ['express', 'helmet', 'zod'],
  ),
  layer('commands', 'server/commands/', ['http'], ['commander', 'picocolors']),
  layer('cli', 'server/cli.ts', ['commands']),
];

function layer(name: string, path: string, standsOn: string[], packages: string[] = []): Layer {
  return { name, path, standsOn, packages };
}

/** The layers that this one may import, itself first. */
export function allowedFor(layer: Layer): readonly Layer[] {
  const found = new Set([layer]);
  for (const each of found) {
    for (const name of each.standsOn) found.add(layerNamed(name));
  }
  return [...found];
}

function layerNamed(name: string): Layer {
  const layer = LAYERS.find((each) => each.name === name);
  if (layer === undefined) throw new Error(`invariant: the table has no layer ${name}`);
  return layer;
}
