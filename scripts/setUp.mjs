/**
 * Installs and builds what is missing or out of date, and nothing else. It runs before anything is
 * installed, so it is plain JavaScript and imports only what Node brings.
 */
import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { isStale } from './age.mjs';
import { root } from './root.mjs';

/** npm writes this file when it has installed; it tells how old the installation is. */
const INSTALLED = `${root}/node_modules/.package-lock.json`;

export async function setUp() {
  refuseOldNode();
  if (isStale(INSTALLED, [`${root}/package-lock.json`])) install();
  const { buildIfStale } = await import('./build.mjs');
  await buildIfStale();
}

function refuseOldNode() {
  const { engines } = JSON.parse(readFileSync(`${root}/package.json`, 'utf8'));
  if (isAtLeast(process.versions.node, engines.node.replace('>=', ''))) return;
  console.error(`Evenkeel needs Node ${engines.node}; this is ${process.versions.node}.`);
  process.exit(1);
}

/**
 * @param {string} version
 * @param {string} needed
 */
export function isAtLeast(version, needed) {
  return version.localeCompare(needed, 'en', { numeric: true }) >= 0;
}

function install() {
  console.error('Installing the packages that package-lock.json lists ...');
  const npm = process.env.npm_execpath;
  const { status } = npm
    ? spawnSync(process.execPath, [npm, 'ci'], { cwd: root, stdio: ['ignore', 2, 2] })
    : spawnSync('npm ci', { cwd: root, stdio: ['ignore', 2, 2], shell: true });
  if (status !== 0) process.exit(status ?? 1);
}

if (process.argv[1] === import.meta.filename) await setUp();
