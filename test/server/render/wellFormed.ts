/** A strict reading of a page: quoted attributes, closed elements, known entities, unique ids. */

const TOKEN =
  /<!DOCTYPE html>|<\/([A-Za-z][\w-]*)\s*>|<([A-Za-z][\w-]*)((?:\s+[\w:-]+="[^"<]*")*)\s*(\/?)>|<|&(#\d+|#x[0-9a-f]+|amp|lt|gt|quot);|&/gi;
const ATTRIBUTE = /([\w:-]+)="([^"]*)"/g;

export interface Reading {
  readonly faults: readonly string[];
  readonly ids: ReadonlySet<string>;
  /** Targets of the page's own links. */
  readonly targets: ReadonlySet<string>;
  /** Elements by name. */
  readonly counts: ReadonlyMap<string, number>;
}

export function readStrictly(page: string): Reading {
  const faults: string[] = [];
  const open: string[] = [];
  const ids = new Set<string>();
  const targets = new Set<string>();
  const counts = new Map<string, number>();
  for (const match of page.matchAll(TOKEN)) {
    const [whole, closed, opened, attributes = '', selfClosed] = match;
    if (whole === '<' || whole === '&')
      faults.push(`a bare ${whole} at ${page.slice(match.index, match.index + 30)}`);
    if (closed !== undefined && open.pop() !== closed) faults.push(`</${closed}> closes another element`);
    if (opened === undefined) continue;
    counts.set(opened, (counts.get(opened) ?? 0) + 1);
    if (selfClosed === '') open.push(opened);
    const seen = new Set<string>();
    for (const [, name, value] of attributes.matchAll(ATTRIBUTE)) {
      if (seen.has(name!)) faults.push(`${name} twice in <${opened}>`);
      seen.add(name!);
      if (name === 'id' && ids.has(value!)) faults.push(`id ${value} twice`);
      if (name === 'id') ids.add(value!);
      if (name === 'href') targets.add(value!);
    }
  }
  if (open.length > 0) faults.push(`never closed: ${open.join(' ')}`);
  return { faults, ids, targets, counts };
}
