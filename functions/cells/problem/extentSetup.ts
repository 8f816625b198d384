/**
 * From the words of a sheet to a problem for the one-reaction solver, and back to the units of the sheet.
 */
import type { CheckedReaction } from '../../chemistry/balancedEquation.ts';
import { matchSpecies } from '../../chemistry/match.ts';
import { GAS_CONSTANT_L_BAR } from '../../data/constants.ts';
import type { ExtentProblem } from '../../equilibrium/extentProblem.ts';
import { inputError } from '../../errors.ts';
import type { AmountsTable } from '../reading/amounts.ts';
import { type Conditions, NO_CONDITIONS } from '../reading/conditions.ts';
import { linePlace } from '../reading/tableForm.ts';
import { unitText } from './basis.ts';
import { lnReference } from './constant.ts';
import type { MatchedLines } from './matchedLines.ts';
import { feedOf } from './feed.ts';
import { type Setting, settingOf } from './medium.ts';
import { mixedInert } from './mixedInert.ts';
import { pressureBar, temperatureK, volumeL } from './state.ts';

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
  checkInert(reaction, conditions, matched);
  checkAsGiven(setting, matched);
  checkFractions(setting, matched, reaction);
  checkDissolved(setting, matched, reaction, conditions);
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

/** K for amounts as given speaks of one unit; with several, only a reaction in which it cancels is clear. */
function checkAsGiven({ medium, mixed, change }: Setting, { form, factors, reacting }: MatchedLines): void {
  if (medium !== 'as given' || change === 0) return;
  const other = factors.findIndex((factor, i) => mixed[i] && factor !== 1);
  if (other === -1) return;
  const line = form.lines[reacting[other]!]!;
  throw inputError('amounts-as-given', { place: linePlace(form, line), unit: unitText(line) });
}

/** A bare `%` or `ppm` is common for the moles of a gas; of a liquid, a solid or a solute it may mean mass. */
function checkFractions(
  { medium }: Setting,
  { form, reacting }: MatchedLines,
  { species }: CheckedReaction,
): void {
  if (medium === 'gas') return;
  reacting.forEach((position, i) => {
    const line = form.lines[position]!;
    const tag = species[i]!.phase;
    const isClear = tag === 'g' || (tag === null && medium === 'as given');
    if (line.unit?.quantity !== 'fraction' || isClear) return;
    throw inputError('amounts-fraction', { place: linePlace(form, line), unit: line.unit.text });
  });
}

/** Constants of dissolved species are stated in mol/L; with amounts as given in mmol/L one of the two is meant. */
function checkDissolved(
  { medium, mixed, change }: Setting,
  { form, reacting, reference }: MatchedLines,
  { species }: CheckedReaction,
  { rows }: Conditions,
): void {
  if (medium !== 'as given' || rows.has('medium') || rows.has('K in terms of') || change === 0) return;
  if (reference === null || DISSOLVED_UNITS.includes(reference.text)) return;
  const dissolved = species.findIndex(({ phase }, i) => phase === 'aq' && mixed[i]);
  if (dissolved === -1) return;
  const line = form.lines[reacting[dissolved]!]!;
  throw inputError('amounts-dissolved', { place: linePlace(form, line), unit: reference.text });
}

const DISSOLVED_UNITS = ['mol/L', 'mol/kg'];

/** A species named as inert must be fed and must not stand in the equation. */
function checkInert(reaction: CheckedReaction, conditions: Conditions, { form, inert }: MatchedLines): void {
  for (const name of conditions.inert) {
    if (inert.some(({ position }) => form.lines[position]!.species === name)) continue;
    if (matchSpecies({ species: inert.map(({ species }) => species()) }, name) !== null) continue;
    throw inputError('condition-inert', { name, equation: reaction.text });
  }
}

function wrongBasis({ unitText: unit }: MatchedLines, medium: string, wanted: string) {
  return inputError('amounts-basis', { unit: unit ?? 'no unit', medium, wanted });
}
