/**
 * From the words of a sheet to a problem for the one-reaction solver, and back to the units of the sheet.
 */
import type { CheckedReaction } from '../../chemistry/balancedEquation.ts';
import { GAS_CONSTANT_L_BAR } from '../../data/constants.ts';
import type { ExtentProblem } from '../../equilibrium/extentProblem.ts';
import { inputError } from '../../errors.ts';
import type { AmountsTable } from '../reading/amounts.ts';
import { type Conditions, NO_CONDITIONS } from '../reading/conditions.ts';
import { lnReference } from './constant.ts';
import type { MatchedLines } from './matchedLines.ts';
import { feedOf } from './feed.ts';
import { type Setting, settingOf } from './medium.ts';
import { mixedInert } from './mixedInert.ts';
import { pressureBar, temperatureK, volumeL } from './state.ts';
import { refuseUnclearWords } from './unclearWords.ts';

export interface ExtentSetup {
  readonly reaction: CheckedReaction;
  readonly table: AmountsTable;
  readonly conditions: Conditions;
  readonly setting: Setting;
  readonly matched: MatchedLines;
  readonly problem: ExtentProblem;
  /** ln K on the activity basis less ln K as stated; ln Q in the stated terms is ln Q less this. */
  readonly lnBasisShift: number;
}

/**
 * The problem that an equation, ln K as stated, amounts and conditions state together.
 *
 * Errors: those of the medium, the constant, the amounts and the conditions.
 */
export function extentSetup(
  reaction: CheckedReaction,
  lnK: number,
  table: AmountsTable,
  conditions: Conditions = NO_CONDITIONS,
): ExtentSetup {
  const setting = settingOf(conditions, reaction);
  const { matched, feed } = feedOf(reaction, table, conditions.rows.has('removal'));
  refuseUnclearWords(reaction, conditions, setting, matched);
  const { change, mixed, isFraction } = setting;
  const lnBasisShift = change === 0 ? 0 : change * lnReference(setting, conditions, matched.reference);
  const problem: ExtentProblem = {
    species: setting.species,
    unit: matched.unitText,
    stoichiometry: reaction.stoichiometry,
    feed,
    mixed,
    activity: isFraction ? 'fraction' : 'amount',
    lnScale: change === 0 ? 0 : lnScale(setting, matched, conditions),
    inert: isFraction ? inertAmount(setting, matched, table) : 0,
    lnK: lnK + lnBasisShift,
  };
  return { reaction, table, conditions, setting, matched, problem, lnBasisShift };
}

/** ln of the activity of a unit amount (or of the unit fraction) of a mixed species. */
function lnScale({ medium, isFraction }: Setting, matched: MatchedLines, conditions: Conditions): number {
  const { basis, factor } = matched;
  if (medium === 'as given' || medium === 'ideal liquid') return 0;
  if (medium === 'gas' && isFraction) {
    if (basis === 'pressure' || basis === 'concentration')
      throw wrongBasis(matched, 'a gas at a pressure', 'mol or mol %');
    return Math.log(pressureBar(conditions, 'a gas'));
  }
  if (medium === 'gas') {
    if (basis === 'pressure') return Math.log(factor);
    const RT = GAS_CONSTANT_L_BAR * temperatureK(conditions, 'a gas in a volume');
    if (basis === 'concentration') return Math.log(factor * RT);
    if (basis === 'amount') return Math.log((factor * RT) / volumeL(conditions, 'a gas in a volume'));
    throw wrongBasis(matched, 'a gas in a volume', 'mol, mol/L or bar');
  }
  if (basis === 'concentration') return Math.log(factor);
  if (basis === 'amount') return Math.log(factor / volumeL(conditions, 'a solution with amounts in mol'));
  throw wrongBasis(matched, 'a solution', 'mol/L, or mol with a volume row');
}

function inertAmount({ medium }: Setting, matched: MatchedLines, { amounts }: AmountsTable): number {
  let sum = 0;
  for (const { position, factor } of mixedInert(matched, medium)) sum += amounts[position]! * factor();
  return sum;
}

function wrongBasis({ unitText: unit }: MatchedLines, medium: string, wanted: string) {
  return inputError('amounts-basis', { unit: unit ?? 'no unit', medium, wanted });
}
