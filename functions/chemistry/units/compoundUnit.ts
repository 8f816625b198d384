import { create, type MathJsInstance, createUnitDependencies, unitDependencies } from 'mathjs';
import { makeUnit, type Quantity, type Unit } from './unit.ts';

/** Units that may stand in a compound; the library's own inexact ones (psi, torr, mmHg) may not. */
export const COMPOUND_PARTS: ReadonlySet<string> = new Set(
  (
    'mol kmol mmol umol nmol lbmol g kg mg ug t lb L mL m3 dm3 cm3 m dm cm mm km ft in s ms min h d ' +
    'K J kJ MJ GJ cal kcal W kW MW N kN Pa hPa kPa MPa bar mbar atm'
  ).split(' '),
);

/** Parts that the library lacks, by their exact definitions. */
const ADDED: Readonly<Record<string, string>> = {
  lbmol: '453.59237 mol',
  cal: '4.184 J',
  kcal: '4184 J',
  d: '86400 s',
};

const LONGEST_COMPOUND = 60;

/** Quantity by the exponents of mass, length, time, current, temperature, light, amount, angle, data. */
const QUANTITIES: ReadonlyMap<string, readonly [Quantity, baseUnits: number, perSI: number]> = new Map([
  ['0,0,0,0,0,0,1,0,0', ['amount', 1, 1]],
  ['0,0,-1,0,0,0,1,0,0', ['amount flow', 1, 1]],
  ['1,0,0,0,0,0,0,0,0', ['mass', 1000, 1]],
  ['1,0,-1,0,0,0,0,0,0', ['mass flow', 1000, 1]],
  ['0,-3,0,0,0,0,1,0,0', ['concentration', 1, 1000]],
  ['-1,0,0,0,0,0,1,0,0', ['molality', 1, 1]],
  ['1,-3,0,0,0,0,0,0,0', ['mass concentration', 1, 1]],
  ['1,-1,-2,0,0,0,0,0,0', ['pressure', 1, 1e5]],
  ['0,0,0,0,1,0,0,0,0', ['temperature', 1, 1]],
  ['0,3,0,0,0,0,0,0,0', ['volume', 1000, 1]],
  ['0,3,-1,0,0,0,0,0,0', ['volume flow', 1000, 1]],
  ['0,0,1,0,0,0,0,0,0', ['time', 1, 1]],
  ['1,2,-2,0,0,0,0,0,0', ['energy', 1, 1000]],
  ['1,2,-2,0,0,0,-1,0,0', ['molar energy', 1, 1000]],
  ['1,2,-2,0,-1,0,-1,0,0', ['molar entropy', 1, 1]],
]);

/**
 * A unit put together from others by products, quotients and whole powers: `kg/m^3`, `kJ/(kg K)`.
 *
 * Null where it cannot be read: an unknown part, a number other than a power, a divisor of several
 * parts without brackets (`J/mol K` has two readings), or a quotient in which everything cancels.
 */
export function compoundUnit(text: string): Unit | null {
  if (text.length > LONGEST_COMPOUND || !hasClearForm(text)) return null;
  const parsed = parse(text);
  if (parsed === null) return null;
  const { value, dimensions } = parsed;
  const exponents = dimensions.join();
  const isUsable = Number.isFinite(value) && value > 0 && dimensions.some((exponent) => exponent !== 0);
  if (!isUsable) return null;
  const known = QUANTITIES.get(exponents);
  if (known === undefined) {
    return makeUnit({ text, quantity: 'other', numerator: value, dimensions: exponents });
  }
  const [quantity, baseUnits, perSI] = known;
  return makeUnit({ text, quantity, numerator: value * baseUnits, denominator: perSI });
}

function hasClearForm(text: string): boolean {
  const pieces = text.match(/[A-Za-z]+3?|\^-?[1-6](?!\d)|[ */()]/g) ?? [];
  const isWhole = pieces.join('') === text;
  const areKnown = pieces.every((piece) => !/^[A-Za-z]/.test(piece) || COMPOUND_PARTS.has(piece));
  return isWhole && areKnown && !/\/.*[ *]/.test(text.replace(/\([^()]*\)/g, '1'));
}

function parse(text: string): { value: number; dimensions: readonly number[] } | null {
  try {
    return library().unit(`1 ${text}`);
  } catch {
    return null;
  }
}

let instance: Pick<MathJsInstance, 'unit'> | undefined;

/** The library's units, made when the first compound is read, to keep the start quick. */
function library(): Pick<MathJsInstance, 'unit'> {
  if (instance === undefined) {
    const made = create({ unit: unitDependencies!, createUnit: createUnitDependencies! });
    for (const [name, definition] of Object.entries(ADDED)) made.createUnit(name, definition);
    instance = made;
  }
  return instance;
}
