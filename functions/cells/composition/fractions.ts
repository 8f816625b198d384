import { matchSpecies } from '../../chemistry/match.ts';
import { parseSpecies, type Species } from '../../chemistry/species.ts';
import { molPerUnit } from '../../chemistry/units/molPerUnit.ts';
import { inputError, withPlace } from '../../errors.ts';
import { defineFunction } from '../entry.ts';
import { AMOUNTS } from '../parameters/common.ts';
import { optional } from '../parameters/optional.ts';
import { text } from '../parameters/text.ts';
import { words } from '../parameters/words.ts';
import { commonBasis } from '../problem/basis.ts';
import { negativeAmount } from '../problem/feed.ts';
import { type AmountsTable, alignedWith } from '../reading/amounts.ts';
import { alignedShape } from '../reading/lines.ts';
import { linePlace, type TableForm } from '../reading/tableForm.ts';

const PHASES = ['g', 'l', 's', 'aq'];

export const compositionFractions = defineFunction({
  name: 'COMPOSITION.FRACTIONS',
  summary: 'The amount fractions of a mixture; on a dry basis with the water left out.',
  parameters: {
    amounts: AMOUNTS,
    'left out': optional(
      words('Species that are not counted, one text or a range of them, such as "H2O(g)".'),
    ),
    phase: optional(text('Count one phase only: g, l, s or aq.')),
  },
  gives: 'one cell for each line of the table, blank for a line that is not counted',
  shape: ({ amounts }) => alignedShape(amounts!),
  examples: [
    {
      cells: {
        A1: [
          ['species', 'amount', 'unit'],
          ['CO(g)', 1, 'mol'],
          ['H2(g)', 3, 'mol'],
          ['H2O(g)', 4, 'mol'],
        ],
      },
      formula: '=COMPOSITION.FRACTIONS(A1:C4, "H2O(g)")',
      gives: [['fraction'], [0.25], [0.75], [null]],
      source: 'by hand: 1 and 3 of 4 mol dry',
    },
  ],
  run({ amounts, 'left out': leftOut = [], phase }) {
    if (phase !== undefined && !PHASES.includes(phase)) throw inputError('phase-word', { phase });
    const { form } = amounts;
    if (!form.isLabelled) throw inputError('amounts-unlabelled', {});
    const species = form.lines.map((line) =>
      withPlace(
        () => linePlace(form, line),
        () => parseSpecies(line.species),
      ),
    );
    refuseUnclear(form, species, phase);
    const omitted = leftOut.map((label) => omittedText(label, species));
    const isCounted = species.map(
      ({ text, phase: tag }) => !omitted.includes(text) && (phase === undefined || tag === phase),
    );
    const counted = form.lines.filter((_, position) => isCounted[position]);
    if (counted.length === 0) throw inputError('fractions-nothing', {});
    commonBasis(counted, form);
    const moles = species.map((one, position) => (isCounted[position] ? molesIn(amounts, position, one) : 0));
    const total = moles.reduce((sum, n) => sum + n, 0);
    if (!(total > 0)) throw inputError('fractions-nothing', {});
    return {
      value: alignedWith(form, 'fraction', (position) =>
        isCounted[position] ? moles[position]! / total : null,
      ),
    };
  },
});

/** A species on two lines, a bare per cent of what is tagged as no gas, or an untagged line where a phase is asked for. */
function refuseUnclear(form: TableForm, species: readonly Species[], phase: string | undefined): void {
  species.forEach(({ text, phase: tag }, position) => {
    const line = form.lines[position]!;
    const place = linePlace(form, line);
    const first = species.findIndex((other) => other.text === text);
    if (first !== position) {
      throw inputError('amounts-twice', { place, first: linePlace(form, form.lines[first]!) });
    }
    if (line.unit?.quantity === 'fraction' && tag !== null && tag !== 'g') {
      throw inputError('amounts-fraction', { place, unit: line.unit.text });
    }
    if (phase !== undefined && tag === null) throw inputError('phase-unknown-line', { place });
  });
}

/** The canonical text of a species that is left out; one that has no line is an error. */
function omittedText(label: string, all: readonly Species[]): string {
  const index = matchSpecies({ species: all }, label);
  if (index === null) throw inputError('left-out-missing', { species: label });
  return all[index]!.text;
}

function molesIn(table: AmountsTable, position: number, species: Species): number {
  const amount = table.amounts[position]!;
  if (amount < 0) throw negativeAmount(table, position);
  const line = table.form.lines[position]!;
  if (line.unit === null) return amount;
  const factor = withPlace(
    () => linePlace(table.form, line),
    () => molPerUnit(line.unit!, species),
  );
  return amount * factor;
}
