/**
 * A formula's text cut into tokens, in one pass and without loss: joined, the tokens are the text.
 *
 * It knows only as much grammar as moving references and mending need. Nothing is refused here:
 * what belongs to no kind is a token of kind `unknown`.
 */
import { MAX_SHEET_NAME, readWrittenCell, splitSheet } from './address.ts';

export type TokenKind =
  | 'text' // "..." with doubled quotes inside
  | 'number'
  | 'cell' // B4, $B$4, Kettle!B4, 'Feed tank'!B4
  | 'columns' // A:C, Kettle!$A:$C
  | 'rows' // 1:3
  | 'function' // a word before an opening bracket
  | 'name' // any other word: a range name, TRUE, FALSE
  | 'error' // #N/A
  | 'operator'
  | 'open' // ( {
  | 'close' // ) }
  | 'separator' // , ;
  | 'space'
  | 'unknown'; // an unclosed quote with all that follows it, a number run into a word, any other sign

export interface Token {
  readonly kind: TokenKind;
  readonly text: string;
}

/** The bound on the length keeps the scan linear: no long word is searched again and again for a `!`. */
const SHEET = String.raw`(?:(?:'(?:[^']|''){1,${MAX_SHEET_NAME}}'|[\p{L}\p{N}_.]{1,${MAX_SHEET_NAME}})!)?`;
const NOT_IN_WORD = String.raw`(?![\p{L}\p{N}_.])`;

/** In the order in which they are tried; each begins where the last token ended. */
const PATTERNS: readonly (readonly [TokenKind, RegExp])[] = [
  ['space', /\s+/uy],
  ['text', /"(?:[^"]|"")*"/uy],
  ['error', /#(?:N\/A|DIV\/0!|[A-Z]+[!?])/uy],
  ['columns', pattern(String.raw`${SHEET}\$?[A-Za-z]{1,3}:\$?[A-Za-z]{1,3}${NOT_IN_WORD}(?!\$)`)],
  ['rows', pattern(String.raw`${SHEET}\$?\d{1,7}:\$?\d{1,7}${NOT_IN_WORD}`)],
  ['cell', pattern(String.raw`${SHEET}\$?[A-Za-z]{1,3}\$?\d{1,14}${NOT_IN_WORD}(?!\s*\()`)],
  ['number', /(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?(?![\p{L}\p{N}_])/uy],
  ['function', /[\p{L}_][\p{L}\p{N}_.]*(?=\s*\()/uy],
  ['name', /[\p{L}_][\p{L}\p{N}_.]*/uy],
  ['operator', /<>|<=|>=|[-+*/^&=<>%:]/uy],
  ['open', /[({]/uy],
  ['close', /[)}]/uy],
  ['separator', /[,;]/uy],
  ['unknown', /"[^]*|'(?:[^']|'')*'?|\p{N}[\p{L}\p{N}_.]*|[^]/uy],
];

function pattern(source: string): RegExp {
  return new RegExp(source, 'uy');
}

/** The tokens of a formula, its leading `=` included as an operator. */
export function formulaTokens(formula: string): Token[] {
  const tokens: Token[] = [];
  for (let at = 0; at < formula.length;) {
    const token = tokenAt(formula, at);
    tokens.push(token);
    at += token.text.length;
  }
  return tokens;
}

function tokenAt(formula: string, at: number): Token {
  for (const [kind, expression] of PATTERNS) {
    expression.lastIndex = at;
    const text = expression.exec(formula)?.[0];
    if (text !== undefined && (kind !== 'cell' || isCell(text))) return { kind, text };
  }
  throw new Error('invariant: any character is a token');
}

/** A word such as ZZZ1 has the look of a cell but lies outside every sheet. */
function isCell(text: string): boolean {
  return readWrittenCell(splitSheet(text).rest) !== null;
}
