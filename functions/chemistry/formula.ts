import { ATOMIC_WEIGHTS } from '../data/atomicWeights.ts';
import { inputError } from '../errors.ts';
import { tellDotsApart } from './dots.ts';
import { add, isZero, multiply, ONE, printDecimal, printRational, type Rational } from './rational.ts';
import { readRational, ZERO } from './rational.ts';

/** The atoms in one formula unit, exactly, by element symbol in the order of first mention. */
export type Atoms = ReadonlyMap<string, Rational>;

export interface Formula {
  /** Canonical: adducts after a middle dot, counts in shortest form. */
  readonly text: string;
  readonly atoms: Atoms;
}

/** More than chemistry needs; the bounds keep the reader quick on any text. */
const DEEPEST_BRACKETS = 20;
const ELEMENT = /[A-Z][a-z]*/y;
const COUNT = /(?:0|[1-9]\d{0,5})(?:\.\d{1,6})?(?![\d.])/y;
const MULTIPLIER = /(?:0|[1-9]\d{0,5})(?:\.\d{1,6}|\/\d{1,6})?(?![\d./])/y;

const ISOTOPES_OF_HYDROGEN = ['D', 'T'];
const CLOSING: Readonly<Record<string, string>> = { '(': ')', '[': ']' };

/**
 * The atoms of a formula without charge and tag, in plain notation.
 *
 * Groups nest in ( ) and [ ]; counts may be decimals (`Fe0.947O`); adducts follow a dot, with a
 * multiplier before them (`CuSO4·5H2O`, `CaSO4·1/2H2O`).
 * Errors: formula-unreadable, element-unknown, isotope, formula-two-readings.
 */
export function parseFormula(written: string): Formula {
  const text = tellDotsApart(written);
  let at = 0;

  const whole = adducts();
  if (at < text.length) throw fail(`"${text[at]}" has no meaning here`);
  return whole;

  function adducts(): Formula {
    let sum = units(0);
    while (take(/·/y) !== undefined) {
      const multiplier = number(MULTIPLIER);
      const part = units(0);
      const count = multiplier === undefined ? '' : printRational(multiplier);
      sum = {
        text: `${sum.text}·${count === '1' ? '' : count}${part.text}`,
        atoms: plus(sum.atoms, part.atoms, multiplier),
      };
    }
    return sum;
  }

  function units(depth: number): Formula {
    let sum: Formula = { text: '', atoms: new Map() };
    for (let unit = element() ?? group(depth); unit !== undefined; unit = element() ?? group(depth)) {
      const count = number(COUNT);
      const printed = count === undefined ? '' : printCount(count, /[A-Z([]/.test(text[at] ?? ''));
      sum = { text: sum.text + unit.text + printed, atoms: plus(sum.atoms, unit.atoms, count) };
    }
    if (sum.text === '') throw fail('an element symbol is wanted');
    return sum;
  }

  function element(): Formula | undefined {
    const start = at;
    const symbol = take(ELEMENT);
    if (symbol === undefined) return undefined;
    if (ISOTOPES_OF_HYDROGEN.includes(symbol)) throw inputError('isotope', { text: written });
    if (!isElement(symbol))
      throw inputError('element-unknown', { symbol, text: written, position: start + 1 });
    return { text: symbol, atoms: new Map([[symbol, ONE]]) };
  }

  function group(depth: number): Formula | undefined {
    const opening = take(/[([]/y);
    if (opening === undefined) return undefined;
    if (depth === DEEPEST_BRACKETS) throw fail(`brackets are nested more than ${DEEPEST_BRACKETS} deep`);
    if (/^\d+[A-Z]/.test(text.slice(at, at + 4))) throw inputError('isotope', { text: written });
    const inside = units(depth + 1);
    const closing = CLOSING[opening]!;
    if (text[at] !== closing) throw fail(`"${closing}" is missing`);
    at += 1;
    return { text: opening + inside.text + closing, atoms: inside.atoms };
  }

  function number(pattern: RegExp): Rational | undefined {
    const figures = take(pattern);
    if (figures === undefined) {
      if (/\d/.test(text[at] ?? '')) throw fail('the number is too long, or begins with 0');
      return undefined;
    }
    if (/\/0*$/.test(figures)) throw fail('a number is divided by 0');
    const value = readRational(figures);
    if (isZero(value)) throw fail('a count of 0 is given');
    return value;
  }

  function take(pattern: RegExp): string | undefined {
    pattern.lastIndex = at;
    const found = pattern.exec(text)?.[0];
    at += found?.length ?? 0;
    return found;
  }

  function fail(reason: string) {
    return inputError('formula-unreadable', { text: written, reason, position: at + 1 });
  }
}

/** Whether the text is the symbol of an element. */
export function isElement(symbol: string): boolean {
  return ATOMIC_WEIGHTS.has(symbol);
}

/** One decimal before more of the formula is printed as two (`Y1.50Ba`): see `tellDotsApart`. */
function printCount(count: Rational, moreFollows: boolean): string {
  const figures = printDecimal(count)!;
  if (figures === '1') return '';
  return moreFollows && /^[1-9]\d*\.\d$/.test(figures) ? `${figures}0` : figures;
}

/** a + count b, atom by atom. */
function plus(a: Atoms, b: Atoms, count: Rational = ONE): Atoms {
  const sum = new Map(a);
  for (const [symbol, atoms] of b) sum.set(symbol, add(sum.get(symbol) ?? ZERO, multiply(count, atoms)));
  return sum;
}
