/** Looks through the commits for one that moved a golden result and did not say so in the changelog. */
import { execFileSync } from 'node:child_process';
import { numbersChanged } from './changelog.ts';
import { GOLDEN_PATH, movedSamples, readGolden } from './file.ts';

export interface HistoryReport {
  /** How many commits wrote the golden file. */
  readonly commits: number;
  /** One line for each result that moved in silence. */
  readonly unexplained: readonly string[];
}

/** Each commit that wrote the golden file is held against the one before it that did. */
export function checkHistory(repository: string): HistoryReport {
  const commits = writers(repository, ['--all']);
  return {
    commits: commits.length,
    unexplained: commits.flatMap((commit) => unexplainedIn(repository, commit)),
  };
}

function unexplainedIn(repository: string, commit: string): string[] {
  const parents = git(repository, ['log', '-1', '--format=%P', commit]).split(' ').filter(Boolean);
  const [previous] = parents.length > 0 ? writers(repository, ['-1', ...parents]) : [];
  if (previous === undefined) return [];
  const before = show(repository, previous, GOLDEN_PATH);
  const after = show(repository, commit, GOLDEN_PATH);
  if (before === null || after === null) return [];
  const lines = movedSamples(readGolden(before), readGolden(after));
  const wereSaid = numbersChanged(show(repository, previous, 'CHANGELOG.md') ?? '');
  const areSaid = numbersChanged(show(repository, commit, 'CHANGELOG.md') ?? '');
  return areSaid.some((entry) => !wereSaid.includes(entry)) ? [] : lines.map((line) => `${commit}: ${line}`);
}

/** The commits that wrote the golden file, the latest first. */
function writers(repository: string, revisions: string[]): string[] {
  return git(repository, ['rev-list', ...revisions, '--', GOLDEN_PATH])
    .split('\n')
    .filter(Boolean);
}

/** The file as the commit holds it; null where it does not. */
function show(repository: string, commit: string, path: string): string | null {
  const isThere = git(repository, ['ls-tree', '--name-only', commit, '--', path]) !== '';
  return isThere ? git(repository, ['show', `${commit}:${path}`]) : null;
}

function git(repository: string, words: string[]): string {
  return execFileSync('git', words, { cwd: repository, encoding: 'utf8', maxBuffer: Infinity }).trimEnd();
}
