/** The page that describes every cell function and every error, from the catalogue and the error tables. */
import { usage } from '../../functions/cells/call.ts';
import type { CellFunction, CellValue, Example } from '../../functions/cells/entry.ts';
import { catalogue } from '../../functions/catalogue.ts';
import type { ErrorTemplate } from '../../functions/errorTable.ts';
import { errorTable } from '../../functions/errors.ts';
import { serverErrorTable } from '../../server/problems.ts';
import type { GeneratedFile } from '../generated.ts';

const HEAD = `<!-- Generated from the catalogue and the error tables by \`npm run generate\`. -->

# Cell functions

Arguments in brackets may be left out. Every example below runs in the tests.
`;

export function files(): GeneratedFile[] {
  const families = [...new Set(catalogue.map(family))].map((name) => ({
    name,
    entries: catalogue.filter((entry) => family(entry) === name),
  }));
  const text = [
    HEAD,
    table(
      ['family', 'functions'],
      families.map(({ name, entries }) => [name, entries.map(link).join(', ')]),
    ),
    ...families.flatMap(({ name, entries }) => [`## ${name}\n`, ...entries.map(section)]),
    errorSection('Errors of the functions', errorTable()),
    errorSection('Errors of workbooks, formulas and commands', serverErrorTable()),
  ].join('\n');
  return [{ path: 'functions/REFERENCE.md', text }];
}

/** The first word of the name. */
function family({ name }: CellFunction): string {
  return name.slice(0, name.indexOf('.'));
}

function link({ name }: CellFunction): string {
  return `[${name}](#${name.toLowerCase().replaceAll('.', '')})`;
}

function section(entry: CellFunction): string {
  const { name, summary, parameters, gives, sources = [], examples } = entry;
  const rows = Object.entries(parameters).map(([parameter, { summary: meaning }]) => [parameter, meaning]);
  return [
    `### ${name}\n`,
    `${summary}\n`,
    `\`${name}(${usage(entry)})\`\n`,
    table(['argument', 'what is given'], rows),
    `Gives ${gives}.\n`,
    ...(sources.length > 0 ? [`Follows ${sources.join('; ')}.\n`] : []),
    ...examples.map(exampleBlock),
  ].join('\n');
}

function exampleBlock({ cells = {}, formula, gives, within, source }: Example): string {
  const blocks = Object.entries(cells).map(([corner, block]) => `${corner}: ${shown(block)}`);
  const lines = [...blocks, formula, `gives ${shown(gives)}`];
  const accuracy = within === undefined ? '' : `; relative difference at most ${within}`;
  return `\`\`\`text\n${lines.join('\n')}\n\`\`\`\n\nSource: ${source}${accuracy}.\n`;
}

function shown(value: CellValue | { readonly error: string }): string {
  if (Array.isArray(value)) return value.map((row: CellValue[]) => row.map(shown).join(' | ')).join('\n    ');
  if (typeof value === 'object' && value !== null && 'error' in value) return `the error ${value.error}`;
  if (typeof value === 'boolean') return value ? 'TRUE' : 'FALSE';
  return value === null ? '' : String(value);
}

function errorSection(heading: string, errors: readonly ({ code: string } & ErrorTemplate)[]): string {
  const rows = errors.map(({ code, says, remedy }) => [`\`${code}\``, says, remedy]);
  return `## ${heading}\n\n${table(['code', 'what it says', 'how to mend it'], rows)}`;
}

function table(head: readonly string[], rows: readonly (readonly string[])[]): string {
  return [head, head.map(() => '---'), ...rows]
    .map((cells) => `| ${cells.map(escaped).join(' | ')} |\n`)
    .join('');
}

/** A bar would end the cell, and an angle bracket begin a tag. */
function escaped(text: string): string {
  return text.replaceAll('|', '\\|').replaceAll('<', '&lt;');
}
