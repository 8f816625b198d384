/** An exact fraction in lowest terms; the denominator is positive. */
export interface Rational {
  readonly numerator: bigint;
  readonly denominator: bigint;
}

export const ZERO: Rational = { numerator: 0n, denominator: 1n };
export const ONE: Rational = { numerator: 1n, denominator: 1n };

/** Fractions of up to eighths are printed as such, others as decimals: 1/2, 2/3, 0.947. */
const LARGEST_PRINTED_DENOMINATOR = 8n;

export function rational(numerator: bigint, denominator = 1n): Rational {
  const divisor = greatestCommonDivisor(numerator, denominator) * (denominator < 0n ? -1n : 1n);
  return { numerator: numerator / divisor, denominator: denominator / divisor };
}

/** The value of a whole number, a decimal or a fraction of them, as typed: `2`, `0.947`, `1/2`. */
export function readRational(text: string): Rational {
  const [over, under = '1'] = text.split('/');
  return divide(readDecimal(over!), readDecimal(under));
}

export function add(a: Rational, b: Rational): Rational {
  return rational(a.numerator * b.denominator + b.numerator * a.denominator, a.denominator * b.denominator);
}

export function subtract(a: Rational, b: Rational): Rational {
  return add(a, { numerator: -b.numerator, denominator: b.denominator });
}

export function multiply(a: Rational, b: Rational): Rational {
  return rational(a.numerator * b.numerator, a.denominator * b.denominator);
}

/** a/b; b is not zero. */
export function divide(a: Rational, b: Rational): Rational {
  return rational(a.numerator * b.denominator, a.denominator * b.numerator);
}

export function isZero(a: Rational): boolean {
  return a.numerator === 0n;
}

/** The nearest number, as long as both terms are below 2^53 (each is rounded on its own beyond). */
export function toNumber(a: Rational): number {
  return Number(a.numerator) / Number(a.denominator);
}

/** The shortest text that reads back as the same fraction. */
export function printRational(a: Rational): string {
  if (a.denominator === 1n) return String(a.numerator);
  if (a.denominator <= LARGEST_PRINTED_DENOMINATOR) return `${a.numerator}/${a.denominator}`;
  return printDecimal(a) ?? `${a.numerator}/${a.denominator}`;
}

/** Its decimal text, or null where the decimals do not end. */
export function printDecimal(a: Rational): string | null {
  let decimals = 0;
  let power = 1n;
  let rest = a.denominator;
  for (const prime of [2n, 5n]) while (rest % prime === 0n) rest /= prime;
  if (rest !== 1n) return null;
  while (power % a.denominator !== 0n) {
    power *= 10n;
    decimals += 1;
  }
  if (decimals === 0) return String(a.numerator);
  const magnitude = (a.numerator < 0n ? -a.numerator : a.numerator) * (power / a.denominator);
  const digits = String(magnitude).padStart(decimals + 1, '0');
  return `${a.numerator < 0n ? '-' : ''}${digits.slice(0, -decimals)}.${digits.slice(-decimals)}`;
}

function readDecimal(text: string): Rational {
  const [whole = '', decimals = ''] = text.split('.');
  return rational(BigInt(whole + decimals), BigInt('1'.padEnd(decimals.length + 1, '0')));
}

/** Euclid's algorithm; never negative. */
export function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let [greater, lesser] = [a, b];
  while (lesser !== 0n) [greater, lesser] = [lesser, greater % lesser];
  return greater < 0n ? -greater : greater;
}
