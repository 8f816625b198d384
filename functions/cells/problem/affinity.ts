/**
 * The reduced affinity ln(K/Q) of a mixture as fed, and its standard uncertainty.
 */
import { convertDifference } from '../../chemistry/units/convert.ts';
import { readUnit } from '../../chemistry/units/readUnit.ts';
import { reactionQuotient } from '../../equilibrium/quotient.ts';
import { inputError } from '../../errors.ts';
import type { Conditions } from '../reading/conditions.ts';
import type { ExtentSetup } from './extentSetup.ts';
import { pressureBar, temperatureK, volumeL } from './state.ts';

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
function amountContributions({ problem, fed, setting, table }: ExtentSetup): number[] {
  const { stoichiometry, feed, inert } = problem;
  const { mixed, change, isFraction } = setting;
  const total = feed.reduce((sum, n, i) => (mixed[i] ? sum + n : sum), inert);
  const byTotal = isFraction ? change / total : 0;
  const reacting = fed.reacting.flatMap((position, i) => {
    const u = table.uncertainties[position] ?? null;
    return u === null || !mixed[i] ? [] : (stoichiometry[i]! / feed[i]! - byTotal) * u * fed.factors[i]!;
  });
  const others = fed.inert.flatMap(({ position, factor }) => {
    const u = table.uncertainties[position] ?? null;
    return u === null || byTotal === 0 ? [] : byTotal * u * factor();
  });
  return [...reacting, ...others];
}

/**
 * d ln(K/Q)/d ln x is the change in mixed amount times an exponent: the constant's reference brings
 * it in, the scale of the activities takes it out.
 */
function conditionContributions({ setting, fed, conditions }: ExtentSetup): number[] {
  const { medium, change, isFraction } = setting;
  if (change === 0 || medium === 'as given' || medium === 'ideal liquid') return [];
  const terms = conditions.rows.get('K in terms of')?.value;
  const isGas = medium === 'gas';
  const exponents = {
    pressure: one(terms === 'mole fraction') - one(isFraction),
    temperature:
      one(isGas && terms === 'concentration') - one(isGas && !isFraction && fed.basis !== 'pressure'),
    volume: one(!isFraction && fed.basis === 'amount'),
  };
  return (['pressure', 'temperature', 'volume'] as const).flatMap((name) => {
    if (exponents[name] === 0) return [];
    const relative = RELATIVE[name](conditions);
    return relative === null ? [] : change * exponents[name] * relative;
  });
}

function one(isSo: boolean): number {
  return isSo ? 1 : 0;
}

const PURPOSE = 'its uncertainty';

/** The relative standard uncertainty of each condition that may enter. */
const RELATIVE = {
  pressure: (given: Conditions) => relative(given, 'pressure', 'bar', pressureBar),
  temperature: (given: Conditions) => relative(given, 'temperature', 'K', temperatureK),
  volume: (given: Conditions) => relative(given, 'volume', 'L', volumeL),
};

function relative(
  conditions: Conditions,
  name: 'pressure' | 'temperature' | 'volume',
  unit: string,
  valueOf: (conditions: Conditions, purpose: string) => number,
): number | null {
  const row = conditions.rows.get(name);
  if (row === undefined || row.uncertainty === null || row.unit === null) return null;
  const base = row.unit.quantity === 'gauge pressure' ? 'bar gauge' : unit;
  return convertDifference(row.uncertainty, row.unit, readUnit(base)) / valueOf(conditions, PURPOSE);
}
