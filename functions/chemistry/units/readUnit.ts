import { inputError } from '../../errors.ts';
import { remember } from '../remember.ts';
import { compoundUnit } from './compoundUnit.ts';
import { expressedAs } from './expressedAs.ts';
import { gasVolume } from './gasVolume.ts';
import { nearestSpelling } from './nearestSpelling.ts';
import { TRADE_UNITS } from './tradeUnits.ts';
import { makeUnit, type Quantity, type Unit } from './unit.ts';

const LONGEST_UNIT = 100;

/** Quantities that have a flow, and what it is called. */
const FLOWS: Partial<Record<Quantity, Quantity>> = {
  amount: 'amount flow',
  mass: 'mass flow',
  volume: 'volume flow',
  'gas volume': 'gas volume flow',
};

/** What people write for a unit whose spelling is too far from it to be found. */
const MEANT: ReadonlyMap<string, string> = new Map([
  ['C', 'degC'],
  ['F', 'degF'],
  ['R', 'degR'],
  ['celsius', 'degC'],
  ['litre', 'L'],
]);

/**
 * The unit that a text stands for.
 *
 * ## Method
 * 1. Raised figures, `°`, `µ` and a small `l` are brought to the spelling of the table.
 * 2. A unit of the trade (`tradeUnits.ts`): `mol %`, `mg/L`, `bar gauge`, `degC`.
 * 3. A volume of gas at its reference: `Nm3(0 degC, 1 atm)`.
 * 4. One of these by time (`kmol/h`), or a mass expressed as a formula (`mg/L as CaCO3`).
 * 5. A compound of known units (`compoundUnit.ts`): `kJ/(kg K)`.
 *
 * Errors: unit-unknown, with the nearest known spelling; unit-reference; those of the formula.
 */
export const readUnit: (text: string) => Unit = remember((written) => {
  const text = plainUnit(written);
  const unit = text.length > LONGEST_UNIT ? null : find(text);
  if (unit !== null) return unit;
  const shown = text.length > LONGEST_UNIT ? `${text.slice(0, 20)}...` : text;
  const nearest = MEANT.get(shown) ?? nearestSpelling(shown, TRADE_UNITS.keys());
  throw inputError('unit-unknown', {
    unit: shown,
    suggestion: nearest === null ? '' : ` (is ${nearest} meant?)`,
  });
});

function find(text: string): Unit | null {
  return (
    TRADE_UNITS.get(text) ??
    gasVolume(text, readUnit) ??
    flow(text) ??
    expressedAs(text, find) ??
    compoundUnit(text)
  );
}

function flow(text: string): Unit | null {
  const slash = text.lastIndexOf('/');
  if (slash < 0) return null;
  const time = TRADE_UNITS.get(text.slice(slash + 1));
  if (time?.quantity !== 'time') return null;
  const flowing = text.slice(0, slash);
  const unit = TRADE_UNITS.get(flowing) ?? gasVolume(flowing, readUnit);
  const quantity = unit && FLOWS[unit.quantity];
  if (!quantity) return null;
  return makeUnit({
    text: `${unit.text}/${time.text}`,
    quantity,
    numerator: unit.numerator,
    denominator: unit.denominator * time.numerator,
  });
}

function plainUnit(text: string): string {
  return text
    .normalize('NFKC')
    .replace(/\s+/g, ' ')
    .trim()
    .replace(/°\s?(?=[CF]\b)/g, 'deg')
    .replace(/μ/g, 'u')
    .replace(/\b([cdm]?m)\^3/g, '$13')
    .replace(/(?<![A-Za-z])([mun]?)l(?![A-Za-z])/g, '$1L');
}
