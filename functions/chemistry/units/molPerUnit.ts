import { inputError } from '../../errors.ts';
import { molarMass } from '../molarMass.ts';
import type { Species } from '../species.ts';
import { formulaUnits } from './expressedAs.ts';
import type { Unit } from './unit.ts';

/**
 * What one of the unit is, of this species, in the molar base unit: mol, mol/s, mol/L, mol/kg, bar, or 1.
 *
 * - Mass: by the molar mass, or through the counted element where it is expressed as a formula.
 * - Charge concentration (`meq/L`, `mg/L as CaCO3`): by the species' charge number.
 * - Gas volume: the amount of ideal gas at its reference.
 * - Pressure, amount fraction and a bare fraction: as they are.
 * - Volume fraction: that of a gas is its amount fraction; of anything else it says too little.
 *
 * Errors: unit-not-molar, composition-missing, weight-missing, charge-missing.
 */
export function molPerUnit(unit: Unit, species: Species): number {
  switch (unit.quantity) {
    case 'amount':
    case 'amount flow':
    case 'gas volume':
    case 'gas volume flow':
    case 'concentration':
    case 'molality':
    case 'pressure':
    case 'fraction':
    case 'amount fraction':
      return unit.factor;
    case 'mass':
    case 'mass flow':
    case 'mass concentration':
      return molPerMass(unit, species);
    case 'charge concentration':
      if (!species.charge) throw inputError('charge-missing', { species: species.text, unit: unit.text });
      return unit.numerator / (unit.denominator * Math.abs(species.charge));
    case 'volume fraction':
      if (species.phase === 'g') return unit.factor;
      throw notMolar(
        unit,
        species,
        'a volume fraction is an amount fraction in a gas only, and no (g) says so',
      );
    case 'mass fraction':
      throw notMolar(unit, species, 'a mass fraction depends on the rest of the mixture');
    default:
      throw notMolar(unit, species, 'it is no amount');
  }
}

function molPerMass(unit: Unit, species: Species): number {
  if (unit.as !== null) {
    const units = formulaUnits(species, unit.as);
    if (units === null)
      throw notMolar(unit, species, `${species.text} does not hold what ${unit.as.name} counts`);
    return unit.numerator / (unit.denominator * molarMass(unit.as) * units);
  }
  const gramPerMol = molarMass(species);
  if (gramPerMol === 0) throw notMolar(unit, species, 'its mass is left out of account');
  return unit.numerator / (unit.denominator * gramPerMol);
}

function notMolar(unit: Unit, species: Species, reason: string) {
  return inputError('unit-not-molar', { unit: unit.text, species: species.text, reason });
}
