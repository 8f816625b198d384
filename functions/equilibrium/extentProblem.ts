/** One reaction to be brought to equilibrium: the problem as plain data, and what makes it unfit. */
import { LARGEST_WEIGHT_SUM } from '../numerics/logSum.ts';

/** JSON-safe, and all that another program needs to work the same problem again. */
export interface ExtentProblem {
  /** Labels, for messages only. */
  readonly species: readonly string[];
  /** Unit of the amounts and of the extent, for reports only; null or absent where they have none. */
  readonly unit?: string | null;
  /** Coefficients: products positive, reactants negative, never 0. */
  readonly stoichiometry: readonly number[];
  /** Amounts to begin with; negative only where something is taken out. */
  readonly feed: readonly number[];
  /** true: in the mixture phase; false: a pure phase, of unit activity. */
  readonly mixed: readonly boolean[];
  /** `fraction`: a_i = (n_i/N) e^lnScale, N the amount in the mixture phase; `amount`: a_i = n_i e^lnScale. */
  readonly activity: 'fraction' | 'amount';
  /** ln(P/p0), ln(RT/(V p0)), ln(1/(V c0)) or 0. */
  readonly lnScale: number;
  /** Amount of the species in the mixture phase that take no part. */
  readonly inert: number;
  /** Natural logarithm of K, in terms of these activities. */
  readonly lnK: number;
}

const ACTIVITIES: readonly string[] = ['fraction', 'amount'];
/** Beyond it a constant has no meaning that an amount could show. */
const LARGEST_LOGARITHM = 1500;
/** Within these, products and quotients of amounts and coefficients are split without loss. */
const SMALLEST_AMOUNT = 1e-250;
const LARGEST_AMOUNT = 1e250;
const SMALLEST_COEFFICIENT = 0.001;
/** The total amount may weigh as much again as all the species. */
const LARGEST_COEFFICIENT_SUM = LARGEST_WEIGHT_SUM / 2;

/** Why the problem cannot be solved as it stands; empty when it can. */
export function flawOf(problem: ExtentProblem): string {
  const { species, stoichiometry, feed, mixed, activity, lnScale, inert, lnK } = problem;
  const count = species.length;
  if (stoichiometry.length !== count || feed.length !== count || mixed.length !== count) {
    return 'the lists of species, coefficients, amounts and phases differ in length';
  }
  if (!ACTIVITIES.includes(activity)) return 'the kind of activity is unknown';
  if (!isWithin(lnK, LARGEST_LOGARITHM)) return `ln K is not within ${LARGEST_LOGARITHM} of 0`;
  if (!isWithin(lnScale, LARGEST_LOGARITHM)) return `lnScale is not within ${LARGEST_LOGARITHM} of 0`;
  if (!(isAmount(inert) && inert >= 0)) return `the inert amount is not ${AN_AMOUNT}`;

  let forward = 0;
  let reverse = 0;
  for (let i = 0; i < count; i++) {
    const nu = stoichiometry[i]!;
    if (!(isWithin(nu, LARGEST_COEFFICIENT_SUM) && Math.abs(nu) >= SMALLEST_COEFFICIENT)) {
      return `the coefficient of ${species[i]} is not ${A_COEFFICIENT}`;
    }
    if (!isAmount(feed[i]!)) return `the amount of ${species[i]} is not ${AN_AMOUNT}`;
    if (!isBoolean(mixed[i])) return `the phase of ${species[i]} is neither mixed nor pure`;
    if (nu > 0) forward += nu;
    else reverse -= nu;
  }
  if (forward === 0 || reverse === 0) return 'the reaction lacks a reactant or a product';
  if (forward + reverse > LARGEST_COEFFICIENT_SUM) {
    return `the coefficients sum to more than ${LARGEST_COEFFICIENT_SUM}`;
  }
  return '';
}

const AN_AMOUNT = `0 or between ${SMALLEST_AMOUNT} and ${LARGEST_AMOUNT}`;
const A_COEFFICIENT = `between ${SMALLEST_COEFFICIENT} and ${LARGEST_COEFFICIENT_SUM} in size`;

function isAmount(n: number): boolean {
  return n === 0 || (isWithin(n, LARGEST_AMOUNT) && Math.abs(n) >= SMALLEST_AMOUNT);
}

/** Not for NaN, nor for a text that reads as a number. */
function isWithin(x: number, largest: number): boolean {
  return Number.isFinite(x) && Math.abs(x) <= largest;
}

function isBoolean(x: unknown): boolean {
  return typeof x === 'boolean';
}
