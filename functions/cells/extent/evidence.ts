import { type CellScalar, defineFunction } from '../entry.ts';
import { AMOUNTS, CONDITIONS, CONSTANT, EQUATION } from '../parameters/common.ts';
import { optional } from '../parameters/optional.ts';
import { text } from '../parameters/text.ts';
import { hasAnswer } from '../../equilibrium/outcome.ts';
import { evidenceShape, evidenceTable } from '../problem/evidence.ts';
import { mixedInert } from '../problem/mixedInert.ts';
import { attempted, type SolvedExtent } from '../problem/solved.ts';
import { unusedConditions } from '../problem/unused.ts';

/** The rows, in order. Their names are what the argument `item` takes. */
const ITEMS: Readonly<Record<string, (solved: SolvedExtent) => CellScalar>> = {
  status: ({ outcome }) => outcome.status,
  reason: ({ outcome }) => outcome.reason,
  extent: ({ outcome }) => (hasAnswer(outcome) ? outcome.extent : null),
  unit: ({ setup }) => setup.matched.unitText,
  'lowest extent': ({ outcome }) => (hasAnswer(outcome) ? outcome.limits[0] : null),
  'highest extent': ({ outcome }) => (hasAnswer(outcome) ? outcome.limits[1] : null),
  'residual in ln units': ({ outcome }) => outcome.residual,
  'error bound in ln units': ({ outcome }) => outcome.errorBound,
  'limiting species': ({ setup, outcome: { limiting } }) =>
    limiting === null ? null : setup.setting.species[limiting]!,
  'inert species': ({ setup: { matched } }) =>
    listed(matched.inert.map(({ position }) => matched.form.lines[position]!.species)),
  medium: ({ setup }) => setup.setting.medium,
  'inert species mixed in it': ({ setup: { matched, setting } }) =>
    listed(
      setting.isFraction
        ? mixedInert(matched, setting.medium).map(({ position }) => matched.form.lines[position]!.species)
        : [],
    ),
  'ln K used': ({ setup }) => setup.problem.lnK,
  'element check': ({ setup }) => elementCheck(setup.reaction.named),
  'conditions not needed': ({ setup }) => listed(unusedConditions(setup)),
  iterations: ({ outcome }) => outcome.iterations,
};

export const extentEvidence = defineFunction({
  name: 'EXTENT.EVIDENCE',
  summary:
    'What stands behind EXTENT.SOLVE for the same arguments: how the solution ended and how well it closes.',
  parameters: {
    equation: EQUATION,
    K: CONSTANT,
    amounts: AMOUNTS,
    conditions: CONDITIONS,
    item: optional(text(`One row only: ${Object.keys(ITEMS).join(', ')}.`)),
  },
  gives: 'rows of item and value, or the one value asked for',
  shape: ({ item }) => evidenceShape(ITEMS, item),
  examples: [
    {
      formula: '=EXTENT.EVIDENCE("A + B = 2 C", 4, {1; 1; 0}, , "status")',
      gives: 'settled',
      source: 'by hand: both sides are present at equilibrium',
    },
    {
      formula: '=EXTENT.EVIDENCE("A + B = 2 C", 4, {1; 1; 0}, , "limiting species")',
      gives: 'A',
      source: 'by hand: A and B run out together; the first is named',
    },
  ],
  run({ item, ...given }) {
    const result = attempted(given);
    return { value: evidenceTable(ITEMS, item, result), outcome: result.outcome };
  },
});

function listed(words: readonly string[]): CellScalar {
  return words.length === 0 ? null : words.join(', ');
}

function elementCheck(named: readonly string[]): string {
  return named.length === 0 ? 'balanced' : `not made: ${named.join(', ')} without a formula`;
}
