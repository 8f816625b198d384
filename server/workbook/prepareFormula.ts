/**
 * A formula's text made ready for the engine (HyperFormula 3.5.0), which reads less than people write.
 *
 * Mended in one pass over the tokens:
 * - `1E-14`: the engine knows only the small e;
 * - `TRUE`, `FALSE` without brackets;
 * - a space between a function and its bracket, and spaces other than the plain ones;
 * - `""` and `\` inside a text, which the engine reads as an end and as an escape;
 * - names, replaced by the range they stand for, because the engine learns names after it has fixed
 *   the size of array answers;
 * - names of sheets that the engine reads only in quotes.
 *
 * Length, nesting and the number of signs are bounded, because the engine walks a formula by
 * recursion: from 200 nested brackets, or 2,000 signs in a row, it overflows the stack and aborts
 * the whole build (measured on Node 20).
 */
import { suggestion } from '../nearest.ts';
import { serverError } from '../problems.ts';
import { sheetPrefix, splitSheet } from './address.ts';
import { characterHelp } from './characterHelp.ts';
import { type Token, formulaTokens } from './formulaTokens.ts';

/** The longest formula in a cell in common spreadsheet practice. */
const MAX_FORMULA_LENGTH = 8192;
/** A third of what overflows the engine's stack. */
const MAX_FORMULA_DEPTH = 60;
/** A quarter of what overflows the engine's stack. */
const MAX_FORMULA_SIGNS = 500;

/** Where names point, by their form for comparison. */
export type NameTable = ReadonlyMap<string, string>;

/** Names are compared without regard to capitals or to how an accent is composed. */
export function comparedName(name: string): string {
  return name.normalize('NFC').toLowerCase();
}

/** The names of a workbook for `prepareFormula`. */
export function nameTable(names: Readonly<Record<string, string>>): NameTable {
  return new Map(Object.entries(names).map(([name, range]) => [comparedName(name), range]));
}

/**
 * The formula in the engine's own dialect.
 *
 * @param formula the author's text, with its leading `=`
 * @throws `formula-too-long`, `formula-too-deep`, `formula-too-many-signs`, `formula-character`,
 * `formula-name`
 */
export function prepareFormula(formula: string, names: NameTable): string {
  if (formula.length > MAX_FORMULA_LENGTH) {
    throw serverError('formula-too-long', { length: formula.length, limit: MAX_FORMULA_LENGTH });
  }
  const tokens = formulaTokens(formula);
  refuseUnknown(tokens);
  refuseDepth(tokens);
  refuseManySigns(tokens);
  return tokens.map((token, at) => mendedToken(token, tokens[at - 1], names)).join('');
}

function mendedToken({ kind, text }: Token, before: Token | undefined, names: NameTable): string {
  switch (kind) {
    case 'number':
      return text.replace('E', 'e');
    case 'text':
      return mendedText(text);
    case 'name':
      return mendedName(text, names);
    case 'space':
      return before?.kind === 'function' ? '' : text.replace(/[^ \t\r\n]/g, ' ');
    case 'cell':
    case 'columns':
    case 'rows': {
      const { sheet, rest } = splitSheet(text);
      return sheet === null ? rest : sheetPrefix(sheet) + rest;
    }
    default:
      return text;
  }
}

/** What the engine cannot read inside a text. */
const UNREADABLE = /(""|\\)/;

/** `"a""b"` becomes `("a"&CHAR(34)&"b")`. */
function mendedText(text: string): string {
  const parts = text.slice(1, -1).split(UNREADABLE);
  if (parts.length === 1) return text;
  const mended = parts.filter((part) => part !== '').map(mendedPart);
  return `(${mended.join('&')})`;
}

function mendedPart(part: string): string {
  if (part === '""') return 'CHAR(34)';
  return part === '\\' ? 'CHAR(92)' : `"${part}"`;
}

function mendedName(name: string, names: NameTable): string {
  if (/^(?:true|false)$/i.test(name)) return `${name.toUpperCase()}()`;
  const range = names.get(comparedName(name));
  if (range === undefined) {
    throw serverError('formula-name', { name, nearest: suggestion(name, [...names.keys()]) });
  }
  return range;
}

function refuseUnknown(tokens: readonly Token[]): void {
  let place = 1;
  let inBraces = 0;
  for (const { kind, text } of tokens) {
    if (text === '{') inBraces += 1;
    if (text === '}') inBraces -= 1;
    if (kind === 'unknown' || (text === ';' && inBraces === 0)) {
      throw serverError('formula-character', { ...characterHelp(text), place });
    }
    place += text.length;
  }
}

function refuseDepth(tokens: readonly Token[]): void {
  let depth = 0;
  let deepest = 0;
  for (const { kind } of tokens) {
    if (kind === 'open') depth += 1;
    if (kind === 'close') depth -= 1;
    deepest = Math.max(deepest, depth);
  }
  if (deepest > MAX_FORMULA_DEPTH) {
    throw serverError('formula-too-deep', { depth: deepest, limit: MAX_FORMULA_DEPTH });
  }
}

function refuseManySigns(tokens: readonly Token[]): void {
  let count = 0;
  for (const token of tokens) count += signsIn(token);
  if (count > MAX_FORMULA_SIGNS) {
    throw serverError('formula-too-many-signs', { count, limit: MAX_FORMULA_SIGNS });
  }
}

/** Signs that the engine will see; what is mended inside a text gets an `&` on either side. */
function signsIn({ kind, text }: Token): number {
  if (kind === 'text') return text.slice(1, -1).split(UNREADABLE).length - 1;
  return kind === 'operator' ? 1 : 0;
}
