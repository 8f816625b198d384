/**
 * The reduced affinity ln(K/Q) of a mixture as fed, and its standard uncertainty.
 */
import type { CheckedReaction } from '../../chemistry/balancedEquation.ts';
import { convertDifference } from '../../chemistry/units/convert.ts';
import { readUnit } from '../../chemistry/units/readUnit.ts';
import { flawOf } from '../../equilibrium/extentProblem.ts';
import { reactionQuotient } from '../../equilibrium/quotient.ts';
import { inputError } from '../../errors.ts';
import type { AmountsTable } from '../reading/amounts.ts';
import type { ConditionName } from '../reading/conditionRows.ts';
import type { Conditions } from '../reading/conditions.ts';
import { type ExtentSetup, extentSetup } from './extentSetup.ts';
import { negativeAmount } from './feed.ts';
import { mixedInert } from './mixedInert.ts';
import { pressureBar, temperatureK, volumeL } from './state.ts';

/**
 * The set-up of a mixture that is only looked at, not worked: nothing may be taken out of it, and it
 * must be a problem that makes sense.
 *
 * Errors: those of `extentSetup`, `amounts-negative`, `problem-unfit`.
 */
export function mixtureSetup(
  reaction: CheckedReaction,
  lnK: number,
  table: AmountsTable,
  conditions: Conditions | undefined,
): ExtentSetup {
  const setup = extentSetup(reaction, lnK, table, conditions);
  const negative = table.amounts.findIndex((amount) => amount < 0);
  if (negative !== -1) throw negativeAmount(table, negative);
  const reason = flawOf(setup.problem);
  if (reason !== '') throw inputError('problem-unfit', { reason });
  return setup;
}

/**
 * ln(K/Q), positive where the reaction runs forward.
 *
 * Errors: `affinity-infinite` where a species is absent, so that it has no number.
 */
export function reducedAffinity({ problem }: ExtentSetup): number {
  const { lnQ, absentReactants, absentProducts } = reactionQuotient(problem);
  if (lnQ !== null) return problem.lnK - lnQ;
  const absent = [...absentReactants, ...absentProducts].map((i) => problem.species[i]);
  throw inputError('affinity-infinite', { absent: absent.join(', ') });
}

/**
 * Standard uncertainty of ln(K/Q) from those of K, of the amounts and of the conditions, to first
 * order; null where none is given.
 *
 * u^2 = u(ln K)^2 + sum (d ln Q/d n_i u(n_i))^2 + (d ln(K/Q)/d ln x u(x)/x)^2 for each condition x,
 * taken as uncorrelated.
 *
 * Source: JCGM 100:2008, equation (10).
 */
export function affinityUncertainty(setup: ExtentSetup): number | null {
  const contributions = [
    ...constantContribution(setup),
    ...amountContributions(setup),
    ...conditionContributions(setup),
  ];
  if (contributions.length === 0) return null;
  return Math.sqrt(contributions.reduce((sum, u) => sum + u * u, 0));
}

function constantContribution({ conditions }: ExtentSetup): number[] {
  const row = conditions.rows.get('K uncertainty');
  return row === undefined ? [] : [row.value as number];
}

/** d ln Q/d n_i = nu_i/n_i for a mixed species, less change/N where activities are fractions. */
function amountContributions({ problem, matched, setting, table }: ExtentSetup): number[] {
  const { stoichiometry, feed, inert } = problem;
  const { mixed, change, isFraction } = setting;
  const total = feed.reduce((sum, n, i) => (mixed[i] ? sum + n : sum), inert);
  const byTotal = isFraction ? change / total : 0;
  const reacting = matched.reacting.flatMap((position, i) => {
    const u = table.uncertainties[position] ?? null;
    return u === null || !mixed[i] ? [] : (stoichiometry[i]! / feed[i]! - byTotal) * u * matched.factors[i]!;
  });
  const counted = isFraction && change !== 0 ? mixedInert(matched, setting.medium) : [];
  const others = counted.flatMap(({ position, factor }) => {
    const u = table.uncertainties[position] ?? null;
    return u === null ? [] : byTotal * u * factor();
  });
  return [...reacting, ...others];
}

/**
 * d ln(K/Q)/d ln x is the change in mixed amount times an exponent: the constant's reference brings
 * it in, the scale of the activities takes it out.
 */
function conditionContributions({ setting, matched, conditions }: ExtentSetup): number[] {
  const { medium, change, isFraction } = setting;
  if (change === 0 || medium === 'as given' || medium === 'ideal liquid') return [];
  const terms = conditions.rows.get('K in terms of')?.value;
  const isGas = medium === 'gas';
  const exponents = {
    pressure: one(terms === 'mole fraction') - one(isFraction),
    temperature:
      one(isGas && terms === 'concentration') - one(isGas && !isFraction && matched.basis !== 'pressure'),
    volume: one(!isFraction && matched.basis === 'amount'),
  };
  return [
    ...relative(exponents.pressure, conditions, ['pressure', 'barometer'], 'bar', pressureBar),
    ...relative(exponents.temperature, conditions, ['temperature'], 'K', temperatureK),
    ...relative(exponents.volume, conditions, ['volume'], 'L', volumeL),
  ].map((u) => change * u);
}

function one(isSo: boolean): number {
  return isSo ? 1 : 0;
}

/** The relative standard uncertainties of a quantity, times its exponent, from the rows that make it up. */
function relative(
  exponent: number,
  conditions: Conditions,
  names: readonly ConditionName[],
  unit: string,
  valueOf: (conditions: Conditions, purpose: string) => number,
): number[] {
  if (exponent === 0) return [];
  return names.flatMap((name) => {
    const row = conditions.rows.get(name);
    if (!row?.unit || row.uncertainty === null) return [];
    const u = convertDifference(row.uncertainty, row.unit, readUnit(unit));
    return (exponent * u) / valueOf(conditions, 'its uncertainty');
  });
}
