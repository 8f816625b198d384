/** The entries of a changelog that say which results moved. */

const SECTION = /^#+ Numbers changed\s*$/;
const ITEM = /^[-*] /;

/** Every item under a heading "Numbers changed", of any release, on one line however it was wrapped. */
export function numbersChanged(changelog: string): string[] {
  const items: string[] = [];
  let isInside = false;
  for (const line of changelog.split('\n')) {
    if (line.startsWith('#')) isInside = SECTION.test(line);
    else if (isInside && ITEM.test(line)) items.push(line.slice(2).trim());
    else if (isInside && line.trim() !== '') items.push(`${items.pop() ?? ''} ${line.trim()}`.trim());
  }
  return items;
}
