import { LineCounter, type ParsedNode, type YAMLError, parseDocument } from 'yaml';
import type { InputError } from '../../functions/errors.ts';
import { serverError } from '../problems.ts';
import { ProblemList, unusableFile } from './fileProblems.ts';

/**
 * Parses the text as one document of YAML 1.2 with the core schema, so `no`, `off` and dates stay text.
 *
 * Doubled keys are left for the caller: the package's own search for them is quadratic.
 *
 * @throws UnusableWorkbook with every error of syntax, or because the document is empty
 */
export function parseYaml(text: string, file: string): { root: ParsedNode; lines: LineCounter } {
  const lines = new LineCounter();
  const { contents, errors, warnings } = parseDocument(text, {
    lineCounter: lines,
    prettyErrors: false,
    schema: 'core',
    uniqueKeys: false,
    version: '1.2',
  });
  const problems = new ProblemList(file, lines);
  const tagless = warnings.filter(({ code }) => code !== 'TAG_RESOLVE_FAILED');
  for (const error of firstOnEachLine([...errors, ...tagless], lines)) {
    problems.add(syntaxError(error), () => error.pos[0]);
  }
  problems.throwIfAny();
  if (contents === null) throw unusableFile(file, serverError('workbook-version', {}));
  return { root: contents, lines };
}

/** What follows on the same line is mostly a consequence of the first error. */
function firstOnEachLine(errors: readonly YAMLError[], lines: LineCounter): YAMLError[] {
  const seen = new Set<number>();
  return [...errors]
    .sort((a, b) => a.pos[0] - b.pos[0])
    .filter((error) => {
      const { line } = lines.linePos(error.pos[0]);
      const isFirst = !seen.has(line);
      seen.add(line);
      return isFirst;
    });
}

/** The package quotes the text it stumbled over, which may be long. */
const LONGEST_MESSAGE = 120;

function syntaxError({ code, message }: YAMLError): InputError {
  const problem = message.slice(0, LONGEST_MESSAGE).replace(/[.:]+$/, '');
  const isEmptyItem = message.startsWith('Unexpected , in flow');
  return serverError('yaml-syntax', {
    problem,
    help: isEmptyItem ? EMPTY_ITEM_HELP : (HELP[code] ?? QUOTES_HELP),
  });
}

const EMPTY_ITEM_HELP = 'Write an empty item as null: [a, null, b].';
const QUOTES_HELP = "Put text with signs in single quotes, and double a quote inside it: 'it''s'.";

const HELP: Partial<Record<YAMLError['code'], string>> = {
  BAD_DQ_ESCAPE: 'In double quotes a \\ begins an escape; use single quotes.',
  BAD_INDENT: 'Close each bracket, and begin the items of one list or one set of keys in the same column.',
  BAD_SCALAR_START: "Put text that begins with a sign in quotes: '%'.",
  BLOCK_AS_IMPLICIT_KEY: 'Put text that holds ": " in quotes, and begin each key on a line of its own.',
  BLOCK_IN_FLOW: "Inside brackets put a lone sign in quotes: '-'.",
  MISSING_CHAR:
    'Close each quote and bracket, put a comma between items and a colon and a space after a key.',
  MULTIPLE_DOCS: 'A workbook is one document: take out the lines --- and ... between them.',
  RESOURCE_EXHAUSTION: 'Lists are nested too deep; put text that holds brackets in quotes.',
  TAB_AS_INDENT: 'Indent with spaces.',
};
