/**
 * Which line of an amounts table is which species of an equation, and by which factor each comes to
 * the one unit of the calculation. All of it follows from words, and is worked once for them.
 */
import type { Reaction } from '../../chemistry/equation.ts';
import { matchSpecies } from '../../chemistry/match.ts';
import { parseSpecies, type Species } from '../../chemistry/species.ts';
import { molPerUnit } from '../../chemistry/units/molPerUnit.ts';
import type { Quantity, Unit } from '../../chemistry/units/unit.ts';
import { inputError, withPlace } from '../../errors.ts';
import { type FormLine, linePlace, type TableForm } from '../reading/tableForm.ts';
import { type Basis, commonBasis } from './basis.ts';
import { rememberPair } from './rememberPair.ts';

export interface MatchedLines {
  readonly form: TableForm;
  /** For each species of the equation, the position of its line in the form. */
  readonly reacting: readonly number[];
  /** For each line of the form, the index of its species in the equation; -1 for an inert one. */
  readonly speciesOf: readonly number[];
  readonly inert: readonly InertLine[];
  readonly basis: Basis;
  /** The unit of the calculation's amounts and of the extent; null where the lines have none in common. */
  readonly reference: Unit | null;
  /** The name of that unit; null where the amounts have none. */
  readonly unitText: string | null;
  /** One unit of the calculation's amounts in mol, mol/s, mol/L, mol/kg, bar or 1. */
  readonly factor: number;
  /** For each species: the calculation's amount in one unit of its line, exactly 1 where that is the same unit. */
  readonly factors: readonly number[];
}

/** A line that is no species of the equation. */
export interface InertLine {
  readonly position: number;
  /** Read only where it counts in the medium, so that a remark among the labels does no harm elsewhere. */
  readonly species: () => Species;
  readonly factor: () => number;
}

/** The quantities of which one unit is the same number of moles whatever the species. */
const SAME_FOR_ALL: readonly Quantity[] = [
  'amount',
  'gas volume',
  'amount flow',
  'gas volume flow',
  'concentration',
  'molality',
  'pressure',
  'fraction',
  'amount fraction',
];

/** The unit of the calculation where the lines have none in common. */
const BASE_UNIT: Readonly<Record<Basis, string | null>> = {
  amount: 'mol',
  'amount flow': 'mol/s',
  concentration: 'mol/L',
  molality: 'mol/kg',
  pressure: 'bar',
  fraction: 'mol/mol',
  'no unit': null,
};

/**
 * The lines of a table as the species of a reaction.
 *
 * Errors: `amounts-missing` (a species without a line), `amounts-twice` (two lines for one species),
 * `amounts-count` (a bare row or column of another length), `species-two-readings`, and those of
 * the units.
 */
export const matchedLines = rememberPair((form: TableForm, reaction: Reaction): MatchedLines => {
  const speciesOf = form.isLabelled ? labelledSpecies(reaction, form) : bareSpecies(reaction, form);
  const reacting = reaction.species.map((_, index) => speciesOf.indexOf(index));
  const lines = reacting.map((position) => form.lines[position]!);
  const basis = commonBasis(lines, form);
  const { unit } = lines[0]!;
  const reference = unit !== null && SAME_FOR_ALL.includes(unit.quantity) ? unit : null;
  const factor = reference?.factor ?? 1;
  const factorOf = (line: FormLine, species: Species): number => {
    if (line.unit === null || line.unit.text === reference?.text) return 1;
    return withPlace(
      () => linePlace(form, line),
      () => molPerUnit(line.unit!, species) / factor,
    );
  };
  const inert = form.lines.flatMap((line, position) => {
    if (speciesOf[position] !== -1) return [];
    const species = () =>
      withPlace(
        () => linePlace(form, line),
        () => parseSpecies(line.species),
      );
    const inertFactor = () => {
      commonBasis([lines[0]!, line], form);
      return factorOf(line, species());
    };
    return [{ position, species, factor: inertFactor }];
  });
  return {
    form,
    reacting,
    speciesOf,
    inert,
    basis,
    reference,
    unitText: reference?.text ?? BASE_UNIT[basis],
    factor,
    factors: lines.map((line, i) => factorOf(line, reaction.species[i]!)),
  };
});

function bareSpecies({ species }: Reaction, { lines }: TableForm): number[] {
  if (lines.length === species.length) return species.map((_, index) => index);
  throw inputError('amounts-count', {
    given: lines.length,
    wanted: species.length,
    species: species.map(({ text }) => text).join(', '),
  });
}

function labelledSpecies(reaction: Reaction, form: TableForm): number[] {
  const speciesOf: number[] = [];
  for (const line of form.lines) {
    const place = () => linePlace(form, line);
    const index = withPlace(place, () => matchSpecies(reaction, line.species)) ?? -1;
    const first = index === -1 ? -1 : speciesOf.indexOf(index);
    if (first !== -1) {
      throw inputError('amounts-twice', { place: place(), first: linePlace(form, form.lines[first]!) });
    }
    speciesOf.push(index);
  }
  const missing = reaction.species.filter((_, index) => !speciesOf.includes(index));
  if (missing.length === 0) return speciesOf;
  const others = form.lines.filter((_, position) => speciesOf[position] === -1).map(({ species }) => species);
  throw inputError('amounts-missing', {
    missing: missing.map(({ text }) => text).join(', '),
    others: others.length === 0 ? '' : `, while ${others.join(', ')} stands on no side of it`,
  });
}
