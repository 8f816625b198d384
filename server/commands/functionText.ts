/** Cell functions as a person reads them in a terminal. */
import type { CellFunction, CellValue, Example } from '../../functions/cells/entry.ts';
import { functionData } from '../http/functionData.ts';

/** A line for each, the families apart. */
export function functionList(entries: readonly CellFunction[]): string {
  const width = Math.max(...entries.map(({ name }) => name.length));
  return entries
    .map(({ name, summary }, index) => {
      const isFirstOfFamily = familyOf(name) !== familyOf(entries[index - 1]?.name ?? name);
      return `${isFirstOfFamily ? '\n' : ''}${name.padEnd(width)}  ${summary}\n`;
    })
    .join('');
}

function familyOf(name: string): string {
  return name.slice(0, name.indexOf('.'));
}

export function functionText(entry: CellFunction): string {
  const { summary, usage, arguments: parameters, gives, sources, examples } = functionData(entry);
  const width = Math.max(0, ...parameters.map(({ name }) => name.length));
  const blocks = [
    usage,
    summary,
    parameters.map(({ name, summary: meaning }) => `  ${name.padEnd(width)}  ${meaning}`).join('\n'),
    `Gives ${gives}.`,
    sources.length === 0 ? '' : `Follows ${sources.join('; ')}.`,
    ...examples.map(exampleText),
  ];
  return `${blocks.filter((block) => block !== '').join('\n\n')}\n`;
}

function exampleText({ cells = {}, formula, gives, source }: Example): string {
  const blocks = Object.entries(cells).map(([corner, block]) => `${corner}: ${valueText(block)}`);
  return ['Example', ...blocks, formula, `gives ${valueText(gives)}`, `(${source})`].join('\n  ');
}

function valueText(value: Example['gives']): string {
  if (Array.isArray(value))
    return (value as CellValue[][]).map((row) => row.map(valueText).join(' | ')).join('\n      ');
  if (typeof value === 'object' && value !== null && 'error' in value) return `the error ${value.error}`;
  return value === null ? '' : String(value);
}
