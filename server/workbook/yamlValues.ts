/**
 * YAML nodes as plain values, with everything refused that YAML reads otherwise than it looks.
 *
 * Mappings become maps without a prototype, so that no key has a meaning of its own.
 */
import { type Pair, type ParsedNode, Scalar, isAlias, isMap, isScalar, isSeq } from 'yaml';
import type { InputError } from '../../functions/errors.ts';
import { serverError } from '../problems.ts';
import { shown } from './shown.ts';

export type PlainValue = null | number | string | boolean | PlainValue[] | PlainMap;
export interface PlainMap {
  [key: string]: PlainValue;
}

export function isPlainMap(value: PlainValue | undefined): value is PlainMap {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** Where an error is reported, with its place in the text. */
export type ReportAt = (error: InputError, offset: number) => void;

/** Rows of an error code expected in a check: the deepest place that a workbook has. */
const MAX_DEPTH = 8;

/** The value of a node; undefined for what cannot be read, which is reported. */
export function plainValue(node: ParsedNode | null, report: ReportAt, depth = 0): PlainValue | undefined {
  if (node === null) return null;
  const offset = node.range[0];
  const refusal = refused(node, depth);
  if (refusal !== null) {
    report(refusal, offset);
    return undefined;
  }
  if (isSeq(node)) {
    return node.items.map((item) => plainValue(item, report, depth + 1) ?? null);
  }
  if (isMap(node)) return plainMap(node.items, report, depth);
  if (!isScalar(node)) throw new Error('invariant: a node is a scalar, a list or a mapping');
  const error = misread(node);
  if (error !== null) report(error, offset);
  const { value } = node;
  return typeof value === 'number' ? value + 0 : (value as string | boolean | null);
}

function refused(node: ParsedNode, depth: number): InputError | null {
  if (isAlias(node)) return serverError('yaml-alias', { sign: '*' });
  if (node.anchor !== undefined) return serverError('yaml-alias', { sign: '&' });
  if (node.tag !== undefined) return serverError('yaml-tag', { tag: shown(node.tag) });
  if (depth > MAX_DEPTH && !isScalar(node)) return serverError('yaml-too-deep', { limit: MAX_DEPTH });
  return null;
}

function plainMap(
  pairs: readonly Pair<ParsedNode, ParsedNode | null>[],
  report: ReportAt,
  depth: number,
): PlainMap {
  const map = Object.create(null) as PlainMap;
  for (const { key, value } of pairs) {
    const name = keyText(key);
    if (name === null || name === '__proto__') {
      report(serverError('yaml-key', { key: name ?? 'this' }), key.range[0]);
    } else if (CONTROL.test(name)) {
      report(controlCharacter(name), key.range[0]);
    } else if (name in map) {
      report(serverError('yaml-key-twice', { key: shown(name) }), key.range[0]);
    } else {
      const plain = plainValue(value, report, depth + 1);
      if (plain !== undefined) map[name] = plain;
    }
  }
  return map;
}

/** A key as it is written: `1.0` and `no` are words here. Null when it is no word. */
export function keyText(key: unknown): string | null {
  if (!isScalar(key) || key.anchor !== undefined || key.tag !== undefined) return null;
  const text = key.type === Scalar.PLAIN ? (key.source ?? '') : String(key.value);
  return text === '' ? null : text;
}

/** Letters and signs that no report could show, and halves of a surrogate pair. */
const CONTROL = /[^\P{Cc}\t\n\r]|\p{Cs}/u;

function misread(scalar: Scalar): InputError | null {
  const { value, source = '' } = scalar;
  if (typeof value === 'number') return misreadNumber(source, value);
  if (typeof value !== 'string') return null;
  if (CONTROL.test(value)) return controlCharacter(value);
  if (scalar.type !== Scalar.PLAIN) return null;
  if (value.startsWith('=')) return serverError('yaml-formula-unquoted', { formula: shown(value) });
  if (/^[+-]?\d+(?:,\d+)+(?:\.\d*)?$/.test(value))
    return serverError('yaml-comma-number', { text: shown(value) });
  return null;
}

function controlCharacter(text: string): InputError {
  const code = CONTROL.exec(text)?.[0].charCodeAt(0) ?? 0;
  const character = `U+${code.toString(16).toUpperCase().padStart(4, '0')}`;
  return serverError('yaml-control-character', { character });
}

/** A number whose digits say something else: 007, 0x1F, .inf, 1e999, 1e-999, 12345678901234567890. */
function misreadNumber(source: string, number: number): InputError | null {
  const isOddlyWritten = /^[+-]?0[\dxo]/.test(source) || !Number.isFinite(number);
  const isLost = number === 0 && /^[^eE]*[1-9]/.test(source);
  const isShortened = /^[+-]?\d+$/.test(source) && !Number.isSafeInteger(number);
  return isOddlyWritten || isLost || isShortened
    ? serverError('yaml-number', { text: shown(source), number })
    : null;
}
