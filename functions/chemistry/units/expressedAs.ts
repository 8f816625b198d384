import { inputError } from '../../errors.ts';
import { molarMass } from '../molarMass.ts';
import { parseSpecies, type Species } from '../species.ts';
import { makeUnit, type Quantity, type Unit } from './unit.ts';

/** Charges that one mole of CaCO3 neutralises or holds: the convention of water analysis. */
const CHARGES_OF_CALCIUM_CARBONATE = 2;

const CAN_BE_EXPRESSED_AS: readonly Quantity[] = ['mass', 'mass flow', 'mass concentration'];

/** Oxygen and hydrogen are not what an analysis `as NO3`, `as SiO2` or `as NH3` counts. */
const NOT_COUNTED: readonly string[] = ['O', 'H'];

/**
 * A mass expressed as another substance: `mg/L as CaCO3`, `mg/L as N`. Null for any other text.
 *
 * A concentration as CaCO3 counts charges, 2 to a mole of CaCO3, and so it is a unit of charge
 * concentration: 50.043 mg/L as CaCO3 is 1 meq/L. Source: common practice of water analysis
 * (hardness, alkalinity); Standard Methods 2320 rounds to 50 000 mg/eq (from memory).
 * As any other formula it counts the one element that is not O or H: see `formulaUnits`.
 * Errors: unit-not-expressible, composition-missing, and those of the formula.
 */
export function expressedAs(text: string, find: (text: string) => Unit | null): Unit | null {
  const at = text.indexOf(' as ');
  if (at < 0) return null;
  const unit = find(text.slice(0, at));
  if (unit === null) return null;
  const as = parseSpecies(text.slice(at + ' as '.length));
  const name = `${unit.text} as ${as.name}`;
  if (!CAN_BE_EXPRESSED_AS.includes(unit.quantity)) {
    throw inputError('unit-not-expressible', { unit: name, reason: `${unit.text} is no mass` });
  }
  const gramPerMol = molarMass(as);
  if (as.name === 'CaCO3' && unit.quantity === 'mass concentration') {
    return makeUnit({
      text: name,
      quantity: 'charge concentration',
      numerator: unit.numerator * CHARGES_OF_CALCIUM_CARBONATE,
      denominator: unit.denominator * gramPerMol,
    });
  }
  if (countedElement(as) === null) {
    throw inputError('unit-not-expressible', {
      unit: name,
      reason: `${as.name} does not hold one element besides O and H`,
    });
  }
  return makeUnit({ ...unit, text: name, as });
}

/**
 * Moles of a formula's counted element in one mole of the species, by those in one mole of the
 * formula: 1 mol of N2O holds 2 mol of NO3, where NO3 counts N. Null where the species has none.
 */
export function formulaUnits(species: Species, as: Species): number | null {
  const element = countedElement(as)!;
  const held = species.composition?.get(element);
  return held === undefined ? null : held / as.composition!.get(element)!;
}

function countedElement(as: Species): string | null {
  const elements = [...as.composition!.keys()];
  const counted =
    elements.length === 1 ? elements : elements.filter((element) => !NOT_COUNTED.includes(element));
  return counted.length === 1 ? counted[0]! : null;
}
