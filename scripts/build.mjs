/**
 * Builds `dist`: the library as modules with their types, and the command line as a bundle, because
 * a bundle starts several times faster than the modules that it is made of.
 */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { isStale } from './age.mjs';
import { root } from './root.mjs';

const DIST = `${root}/dist`;
/** Written when a build begins, so that a source changed while it runs counts as newer. */
const STAMP = '.begun';

const SOURCES = [
  ...['functions', 'server', 'package.json', 'tsconfig.json', 'tsconfig.build.json', 'scripts/build.mjs'],
  'node_modules/.package-lock.json',
].map((path) => `${root}/${path}`);

/**
 * Node 22 and later keep the compiled form of the bundle between runs; the launcher asks for that
 * before the bundle is read. Older ones go on without.
 */
const LAUNCHER = `#!/usr/bin/env node
import module from 'node:module';
module.enableCompileCache?.();
await import('./main.js');
`;

/** Packages written for CommonJS call `require`, which a module has only when it makes it. */
const REQUIRE = `import { createRequire as makeRequire } from 'node:module'; const require = makeRequire(import.meta.url);`;

export async function buildIfStale() {
  if (isStale(`${DIST}/${STAMP}`, SOURCES)) await build();
}

async function build() {
  console.error('Building dist ...');
  // Made aside and put in place whole, so that nobody meets half a build.
  const target = mkdtempSync(`${root}/.build-`);
  try {
    writeFileSync(`${target}/${STAMP}`, '');
    compileLibrary(target);
    await bundleCommandLine(target);
    rmSync(DIST, { recursive: true, force: true });
    renameSync(target, DIST);
  } finally {
    rmSync(target, { recursive: true, force: true });
  }
}

/** @param {string} target */
function compileLibrary(target) {
  const tsc = `${root}/node_modules/typescript/bin/tsc`;
  const { status } = spawnSync(process.execPath, [tsc, '-p', 'tsconfig.build.json', '--outDir', target], {
    cwd: root,
    stdio: ['ignore', 2, 2],
  });
  if (status !== 0) throw new Error('The library does not compile; the compiler says why above.');
}

/** @param {string} target */
async function bundleCommandLine(target) {
  const entry = `${root}/server/cli.ts`;
  if (!existsSync(entry)) throw new Error('server/cli.ts is missing, so there is no command line to bundle.');
  const { build: bundle } = await import('esbuild');
  await bundle({
    entryPoints: { main: entry, 'http/evaluationWorker': `${root}/server/http/evaluationWorker.ts` },
    outdir: target,
    bundle: true,
    // What is imported on demand stays in a file of its own, read only when it is wanted.
    splitting: true,
    chunkNames: 'parts/[name]-[hash]',
    platform: 'node',
    format: 'esm',
    target: 'node20',
    mainFields: ['module', 'main'],
    // Names are kept whole, so that a stack trace can be read.
    minifyWhitespace: true,
    minifySyntax: true,
    banner: { js: REQUIRE },
    logLevel: 'warning',
  });
  writeFileSync(`${target}/cli.js`, LAUNCHER, { mode: 0o755 });
}

if (process.argv[1] === import.meta.filename) await build();
