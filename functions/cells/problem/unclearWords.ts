/**
 * Words of amounts and conditions that leave room for two readings together.
 */
import type { CheckedReaction } from '../../chemistry/balancedEquation.ts';
import { matchSpecies } from '../../chemistry/match.ts';
import { inputError } from '../../errors.ts';
import type { Conditions } from '../reading/conditions.ts';
import { linePlace } from '../reading/tableForm.ts';
import { unitText } from './basis.ts';
import type { MatchedLines } from './matchedLines.ts';
import type { Setting } from './medium.ts';

/** Errors: `condition-inert`, `amounts-as-given`, `amounts-fraction`, `amounts-dissolved`. */
export function refuseUnclearWords(
  reaction: CheckedReaction,
  conditions: Conditions,
  setting: Setting,
  matched: MatchedLines,
): void {
  checkInert(reaction, conditions, matched);
  checkAsGiven(setting, matched);
  checkFractions(setting, matched, reaction);
  checkDissolved(setting, matched, reaction, conditions);
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
