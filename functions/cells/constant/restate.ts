import { readUnit } from '../../chemistry/units/readUnit.ts';
import { inputError, withPlace } from '../../errors.ts';
import { defineFunction } from '../entry.ts';
import { CONDITIONS, EQUATION } from '../parameters/common.ts';
import { positiveNumber } from '../parameters/number.ts';
import { text } from '../parameters/text.ts';
import { lnReference } from '../problem/constant.ts';
import { isHoldable } from '../problem/holdable.ts';
import { constantSetting } from '../problem/medium.ts';
import { CONDITION_RULES } from '../reading/conditionRows.ts';
import { type Condition, type Conditions, NO_CONDITIONS } from '../reading/conditions.ts';

export const kRestate = defineFunction({
  name: 'K.RESTATE',
  summary: 'The same constant in other terms: activity, pressure, concentration or mole fraction.',
  parameters: {
    K: positiveNumber('Constant in the terms `from`.'),
    equation: EQUATION,
    from: text('Terms of K: "activity", "pressure bar", "concentration mol/L" or "mole fraction".'),
    to: text('Terms wanted, written the same way.'),
    conditions: CONDITIONS,
  },
  gives:
    'K in the terms wanted; a temperature row is needed for concentrations of a gas, a pressure row for mole fractions',
  sources: ['IUPAC Green Book, 3rd edition, section 2.11: equilibrium constants (from memory)'],
  examples: [
    {
      cells: { A1: [['temperature', 900, 'K']] },
      formula: '=K.RESTATE(0.0003, "dimer(g) = 2 monomer(g)", "concentration mol/L", "pressure bar", A1:C1)',
      gives: 0.022449049,
      within: 1e-8,
      source: 'by hand: 0.0003 x 0.0831446261815324 L bar/(mol K) x 900 K',
    },
  ],
  run({ K, equation, from, to, conditions = NO_CONDITIONS }) {
    const row = (['K written as', 'K in terms of'] as const).find((name) => conditions.rows.has(name));
    if (row !== undefined) throw inputError('restate-rows', { row });
    const setting = constantSetting(equation, conditions);
    const inTerms = (words: string, argument: string): number =>
      setting.change * lnReference(setting, withTerms(conditions, words, argument), null);
    const lnK = Math.log(K) + inTerms(from, 'from') - inTerms(to, 'to');
    if (!isHoldable(lnK)) throw inputError('constant-too-large', { lnK: lnK.toPrecision(6) });
    return { value: Math.exp(lnK) };
  },
});

/** The conditions with a row `K in terms of` for words such as `pressure bar`. */
function withTerms(conditions: Conditions, words: string, argument: string): Conditions {
  const lowerCase = words.toLowerCase();
  const value = CONDITION_RULES['K in terms of'].words.find(
    (term) => lowerCase === term || lowerCase.startsWith(`${term} `),
  );
  if (value === undefined) throw inputError('restate-terms', { argument, given: words });
  const unitText = words.slice(value.length).trim();
  const unit =
    unitText === ''
      ? null
      : withPlace(
          () => argument,
          () => readUnit(unitText),
        );
  const row: Condition = { row: 0, value, unit, uncertainty: null };
  return { ...conditions, rows: new Map([...conditions.rows, ['K in terms of', row]]) };
}
