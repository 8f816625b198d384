import { inputError } from '../errors.ts';

export interface Charged {
  /** The text without its charge. */
  readonly body: string;
  /** The written charge; null where none is written. */
  readonly charge: number | null;
}

/**
 * The charge at the end of a species text without tag, in plain notation.
 *
 * - After `^`, number and sign in either order: `Ca^2+`, `Ca^+2`, `e^-`.
 * - A formula may put the sign before the number without `^`: `Ca+2`.
 * - A sign alone is one charge: `Na+`, `HCO3-`.
 *
 * A number before a sign without `^` counts atoms (`HCO3-`) where it is one figure at the end of a
 * longer formula. After two figures (`SO42-`), or after one element or one bracketed group and no
 * more (`Fe3+`, `[Fe(CN)6]3-`), it may as well be the charge: an error that shows both readings.
 */
export function splitCharge(text: string): Charged {
  const caret = text.indexOf('^');
  if (caret >= 0) return { body: text.slice(0, caret), charge: chargeAfterCaret(text, caret) };
  const signFirst = /^([A-Z([](?:.*[^+-])?)([+-])([1-9])$/.exec(text);
  if (signFirst) return { body: signFirst[1]!, charge: signed(signFirst[2]!, signFirst[3]!) };
  const bare = /^(.*[^+-])([+-])$/.exec(text);
  if (!bare) return { body: text, charge: null };
  const body = bare[1]!;
  const sign = bare[2]!;
  if (!isClearBeforeSign(body)) {
    throw inputError('formula-two-readings', {
      text,
      first: `${body}^${sign}`,
      second: `${body.slice(0, -1)}^${body.slice(-1)}${sign}`,
    });
  }
  return { body, charge: signed(sign, '1') };
}

/** The shortest text of a charge that reads back as the same after this body. */
export function printCharge(body: string, charge: number): string {
  if (charge === 0) return '';
  const sign = charge > 0 ? '+' : '-';
  const magnitude = Math.abs(charge);
  if (magnitude > 1) return `^${magnitude}${sign}`;
  return isClearBeforeSign(body) && body !== ELECTRON ? sign : `^${sign}`;
}

/** The electron is written `e^-`; `e-` is read too. */
export const ELECTRON = 'e';

function chargeAfterCaret(text: string, caret: number): number {
  const written = /^(?:([1-9]\d?)?([+-])|([+-])([1-9]\d?))$/.exec(text.slice(caret + 1));
  if (written) return signed((written[2] ?? written[3])!, written[1] ?? written[4] ?? '1');
  if (/^\^\d+[A-Z]/.test(text.slice(caret))) throw inputError('isotope', { text });
  throw inputError('charge-unreadable', { text, charge: text.slice(caret) });
}

/** Whether a sign after this body can only mean one charge. */
function isClearBeforeSign(body: string): boolean {
  const figures = /(?:^|[^\d.])(\d+)$/.exec(body)?.[1];
  if (figures === undefined || figures.endsWith('0')) return true;
  return figures.length === 1 && /^[A-Z([]/.test(body) && !isOneUnit(body.slice(0, -1));
}

/** Whether the text is one element symbol, or one group that is bracketed as a whole. */
function isOneUnit(text: string): boolean {
  if (/^[A-Z][a-z]?$/.test(text)) return true;
  if (!/^[([]/.test(text)) return false;
  let depth = 0;
  for (let i = 0; i < text.length; i += 1) {
    if ('(['.includes(text[i]!)) depth += 1;
    else if (')]'.includes(text[i]!)) depth -= 1;
    if (depth === 0) return i === text.length - 1;
  }
  return false;
}

function signed(sign: string, magnitude: string): number {
  return sign === '-' ? -Number(magnitude) : Number(magnitude);
}
