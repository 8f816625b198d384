import type { Species } from '../species.ts';

/** What a unit measures, with the base unit to which its factor leads. */
export type Quantity =
  /** mol */
  | 'amount'
  /** mol/s */
  | 'amount flow'
  /** g */
  | 'mass'
  /** g/s */
  | 'mass flow'
  /** mol of ideal gas: a volume of gas at a stated temperature and pressure */
  | 'gas volume'
  /** mol/s of ideal gas */
  | 'gas volume flow'
  /** mol/L */
  | 'concentration'
  /** mol/kg */
  | 'molality'
  /** g/L */
  | 'mass concentration'
  /** mol of charges per litre */
  | 'charge concentration'
  /** 1, where it is not said of what: `%`, `ppm` */
  | 'fraction'
  /** 1, as are the next two */
  | 'amount fraction'
  | 'mass fraction'
  | 'volume fraction'
  /** bar, absolute */
  | 'pressure'
  /** bar above the barometer */
  | 'gauge pressure'
  /** K */
  | 'temperature'
  /** L */
  | 'volume'
  /** L/s */
  | 'volume flow'
  /** s */
  | 'time'
  /** kJ */
  | 'energy'
  /** kJ/mol */
  | 'molar energy'
  /** J/(mol K); a molar heat capacity too */
  | 'molar entropy'
  /** a pure number */
  | 'none'
  /** anything else; units with the same dimensions convert into each other */
  | 'other';

/** A unit: value in base units = (value + zero) numerator / denominator. */
export interface Unit {
  /** Canonical spelling. */
  readonly text: string;
  readonly quantity: Quantity;
  readonly numerator: number;
  readonly denominator: number;
  /** What is added before scaling; 0 except for degC and degF. */
  readonly zero: number;
  /** One unit, as a difference, in base units: numerator / denominator, rounded. */
  readonly factor: number;
  /** The formula after `as`, in which a mass is expressed (`mg/L as N`); null otherwise. */
  readonly as: Species | null;
  /** Exponents of the base dimensions where the quantity is `other`; empty otherwise. */
  readonly dimensions: string;
}

export function makeUnit(
  unit: Pick<Unit, 'text' | 'quantity' | 'numerator'> &
    Partial<Pick<Unit, 'denominator' | 'zero' | 'as' | 'dimensions'>>,
): Unit {
  const { denominator = 1, zero = 0, as = null, dimensions = '' } = unit;
  return { ...unit, denominator, zero, as, dimensions, factor: unit.numerator / denominator };
}
