/**
 * How numbers are shown: to a number of significant digits, the exact value kept beside them.
 *
 * The minus sign is the hyphen-minus of the keyboard, so that a number copied from the page is read
 * as a number elsewhere; only powers of ten are typeset.
 */
import { html, type Markup } from './html.ts';

/** Significant digits where the workbook declares none. */
const USUAL_DIGITS = 6;
/** Whole numbers are shown whole below this; above, they are shown like any other number. */
const WHOLE_BELOW = 1e9;
/** A power of ten is shown below this one, and where the digits end before the decimal point. */
const LOWEST_PLAIN_POWER = -4;

/** `1.5195`, `5.925e-28`: ASCII, trailing zeros only where `digits` asks for them. */
export function numberText(value: number, digits: number | null = null): string {
  if (
    !Number.isFinite(value) ||
    (digits === null && Number.isInteger(value) && Math.abs(value) < WHOLE_BELOW)
  ) {
    return String(value);
  }
  const significant = digits ?? USUAL_DIGITS;
  const [mantissa, exponent] = value.toExponential(significant - 1).split('e') as [string, string];
  const power = Number(exponent);
  if (value !== 0 && (power < LOWEST_PLAIN_POWER || power >= significant)) {
    return `${digits === null ? withoutZeros(mantissa) : mantissa}e${power}`;
  }
  const plain = value.toFixed(significant - 1 - power);
  return digits === null ? withoutZeros(plain) : plain;
}

/** Rounded to so many digits, without zeros that only fill them: for labels in a picture. */
export function roundedText(value: number, digits: number): string {
  return numberText(Number(value.toPrecision(digits)));
}

/** The number as it is read in a calculation: powers of ten typeset, the exact value in `title`. */
export function numberMarkup(value: number, digits: number | null = null): Markup {
  const { whole, rest, exponent } = numberPieces(numberText(value, digits));
  return data(value, numberText(value, digits), html`${whole}${rest}${powerOfTen(exponent)}`);
}

/** As `numberMarkup`, with what follows the decimal point `width` digits wide, so that points align. */
export function alignedNumber(value: number, width: number, digits: number | null = null): Markup {
  const { whole, rest, exponent } = numberPieces(numberText(value, digits));
  const tail = html`<span class="tail" style="min-width:${width}ch">${rest}${powerOfTen(exponent)}</span>`;
  return data(value, numberText(value, digits), width === 0 ? html`${whole}` : html`${whole}${tail}`);
}

/** How many digits wide the part after the decimal point is, at most, among these numbers. */
export function tailWidth(values: readonly number[], digits: number | null = null): number {
  return Math.max(0, ...values.map((value) => tailLength(numberText(value, digits))));
}

function tailLength(text: string): number {
  const { rest, exponent } = numberPieces(text);
  return rest.length + (exponent === null ? 0 : exponent.length + 3);
}

function numberPieces(text: string): { whole: string; rest: string; exponent: string | null } {
  const [mantissa = '', exponent = null] = text.split('e');
  const [whole = '', decimals] = mantissa.split('.');
  return { whole, rest: decimals === undefined ? '' : `.${decimals}`, exponent };
}

function powerOfTen(exponent: string | null): Markup | null {
  return exponent === null ? null : html`&#215;10<sup>${exponent.replace('-', '\u2212')}</sup>`;
}

/** `title` stands only where what is shown is not the whole number. */
function data(value: number, shown: string, content: Markup): Markup {
  const exact = String(value);
  const title = Number(shown) === value ? null : html`title="${exact}"`;
  return html`<data value="${exact}" ${title}>${content}</data>`;
}

function withoutZeros(decimal: string): string {
  return decimal.includes('.') ? decimal.replace(/\.?0+$/, '') : decimal;
}
