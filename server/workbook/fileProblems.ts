/** The errors found in a file, each at its line and column. */
import { isMap, isSeq } from 'yaml';
import type { LineCounter, Node } from 'yaml';
import type { InputError } from '../../functions/errors.ts';
import { keyText } from './yamlValues.ts';

export interface FileProblem {
  readonly code: string;
  readonly message: string;
  readonly file: string;
  /** Both count from 1; 1 and 1 for the file as a whole. */
  readonly line: number;
  readonly column: number;
}

/** A workbook that cannot be used, with everything that is wrong with it. */
export class UnusableWorkbook extends Error {
  override readonly name = 'UnusableWorkbook';
  readonly problems: readonly FileProblem[];
  constructor(problems: readonly FileProblem[]) {
    super(problems.map(problemLine).join('\n'));
    this.problems = problems;
  }
}

/** A file of which nothing could be read. */
export function unusableFile(file: string, { code, message }: InputError): UnusableWorkbook {
  return new UnusableWorkbook([{ code, message, file, line: 1, column: 1 }]);
}

/** `kettle.yaml:12:7: input acid points at ...` */
function problemLine({ file, line, column, message }: FileProblem): string {
  return `${file}:${line}:${column}: ${message}`;
}

/** The keys and list positions that lead to a place in the document. */
export type Path = readonly (string | number)[];

/** Reports an error at the key or at the value of a place in the document. */
export type Report = (error: InputError, path: Path, part?: 'key' | 'value') => void;

/** Beyond these the rest is most likely one mistake made many times. */
const MOST_PROBLEMS = 50;

/** Collects problems in the order of the file. */
export class ProblemList {
  readonly #file: string;
  readonly #lines: LineCounter;
  readonly #found: { readonly problem: FileProblem; readonly offset: number }[] = [];

  constructor(file: string, lines: LineCounter) {
    this.#file = file;
    this.#lines = lines;
  }

  /** Notes an error, unless there are enough already; its place is asked for only when it is kept. */
  add({ code, message }: InputError, offsetOfError: () => number): void {
    if (this.#found.length >= MOST_PROBLEMS) return;
    const offset = offsetOfError();
    const { line, col: column } = this.#lines.linePos(offset);
    this.#found.push({ problem: { code, message, file: this.#file, line, column }, offset });
  }

  /** Ends the reading when anything was found. */
  throwIfAny(): void {
    if (this.#found.length === 0) return;
    const inOrder = this.#found.toSorted((a, b) => a.offset - b.offset);
    throw new UnusableWorkbook(inOrder.map(({ problem }) => problem));
  }
}

/** Where in the text a place lies; the nearest place around it when it is missing. */
export function offsetOf(root: Node, path: Path, part: 'key' | 'value' = 'value'): number {
  let node: Node = root;
  let key: Node = root;
  for (const step of path) {
    const next = child(node, step);
    if (next === null) return startOf(node);
    key = next.key;
    node = next.value;
  }
  return startOf(part === 'key' ? key : node);
}

function child(node: Node, step: string | number): { key: Node; value: Node } | null {
  if (isSeq(node)) {
    const item = node.items[Number(step)] as Node | undefined;
    return item === undefined ? null : { key: item, value: item };
  }
  if (!isMap(node)) return null;
  const pair = node.items.find(({ key }) => keyText(key) === String(step));
  if (pair === undefined) return null;
  return { key: pair.key as Node, value: (pair.value ?? pair.key) as Node };
}

function startOf(node: Node): number {
  return node.range?.[0] ?? 0;
}
