/**
 * One-reaction equilibrium in 50-digit arithmetic, as an outside check on the solver.
 *
 * It shares nothing with the solver. Amounts at a limit are exact integers; the equation is
 *
 *     product of n_i^nu_i over products = K' N^c times product of n_i^abs(nu_i) over reactants
 *
 * in whole powers (half coefficients are doubled, and K' with them), without a logarithm; its root is found by bisection.
 */
import { bignumberDependencies, create, type BigNumber } from 'mathjs';
import type { ExtentProblem } from '../../functions/equilibrium/index.ts';
import { exactDoubles } from './exactDouble.ts';

const math = create(bignumberDependencies!, { precision: 50 });
const big = (x: number | string) => math.bignumber(x);

/** The double itself, not its shortest decimal. */
export function exactNumber(x: number): BigNumber {
  const { mantissas, exponent } = exactDoubles([x]);
  return big(String(mantissas[0])).times(big(2).pow(exponent));
}

export interface OracleAnswer {
  /** `no room`: nothing can react; `limit`: a pure phase is used up; `root`: a balance. */
  readonly kind: 'no room' | 'infeasible' | 'limit' | 'root';
  readonly amounts: BigNumber[];
}

/** Halvings of the bracket after the root is known within a factor 2: an error of 2^-48. */
const HALVINGS = 48;

/** For problems with a slope: not for a solid in nothing but its own gas at fixed pressure. */
export function solveInFiftyDigits(problem: ExtentProblem): OracleAnswer {
  const multiple = problem.stoichiometry.every(Number.isInteger) ? 1 : 2;
  const nu = problem.stoichiometry.map((coefficient) => BigInt(multiple * coefficient));
  const { mantissas, exponent } = exactDoubles([...problem.feed, problem.inert]);
  const unit = big(2).pow(exponent);
  const feed = mantissas.slice(0, -1);
  const inert = big(String(mantissas.at(-1))).times(unit);

  const product = firstUsedUp(nu, feed, 1n);
  const reactant = firstUsedUp(nu, feed, -1n);
  /** Amounts where species k is used up, as |nu_k| times whole numbers. */
  const amountsAt = (k: number) => {
    const sign = nu[k]! < 0n ? -1n : 1n;
    return feed.map((n, i) =>
      big(String(sign * (n * nu[k]! - nu[i]! * feed[k]!)))
        .times(unit)
        .div(String(sign * nu[k]!)),
    );
  };
  const lowest = amountsAt(product);
  const room = lowest[reactant]!;
  if (room.isNegative() && !room.isZero()) return { kind: 'infeasible', amounts: [] };
  if (room.isZero()) return { kind: 'no room', amounts: lowest };

  const half = room.div(String(-nu[reactant]!)).div(2);
  const sign = balance(problem, nu, multiple, inert);
  const side = sign(moved(nu, lowest, half)) >= 0 ? 1 : -1;
  const start = side > 0 ? lowest : amountsAt(reactant);
  const at = (distance: BigNumber) => moved(nu, start, distance.times(side));

  const isMixtureGone = problem.activity === 'fraction' && sumMixed(problem, start, inert).isZero();
  const vanishes = !isMixtureGone && start.some((n, i) => problem.mixed[i] && n.isZero());
  if (!vanishes && sign(start) * side >= 0) return { kind: 'limit', amounts: start };
  return { kind: 'root', amounts: at(bisect((distance) => sign(at(distance)) * side > 0, half)) };
}

/** Whole-number comparison of n/abs(nu). */
function firstUsedUp(nu: readonly bigint[], feed: readonly bigint[], side: bigint): number {
  let first = -1;
  for (let i = 0; i < nu.length; i++) {
    if (nu[i]! * side < 0n) continue;
    if (first < 0 || feed[i]! * nu[first]! * side < feed[first]! * nu[i]! * side) first = i;
  }
  return first;
}

function moved(nu: readonly bigint[], amounts: readonly BigNumber[], x: BigNumber): BigNumber[] {
  return amounts.map((n, i) => n.plus(x.times(String(nu[i]))));
}

function sumMixed({ mixed }: ExtentProblem, amounts: readonly BigNumber[], inert: BigNumber): BigNumber {
  return amounts.reduce((sum, n, i) => (mixed[i] ? sum.plus(n) : sum), inert);
}

/** The sign of Q - K at given amounts. */
function balance(problem: ExtentProblem, nu: readonly bigint[], multiple: number, inert: BigNumber) {
  const { mixed, activity, lnK, lnScale } = problem;
  const powers = nu.map((whole, i) => (mixed[i] ? Number(whole) : 0));
  const change = powers.reduce((sum, power) => sum + power, 0);
  const constant = exactNumber(lnK).times(multiple).minus(exactNumber(lnScale).times(change)).exp();
  return (amounts: readonly BigNumber[]): number => {
    const total = sumMixed(problem, amounts, inert);
    const totalPower = activity === 'fraction' ? change : 0;
    const made = product(amounts, powers).times(power(total, -totalPower));
    const used = product(
      amounts,
      powers.map((p) => -p),
    ).times(power(total, totalPower));
    return made.cmp(used.times(constant));
  };
}

function product(amounts: readonly BigNumber[], powers: readonly number[]): BigNumber {
  return amounts.reduce((all, n, i) => (powers[i]! > 0 ? all.times(power(n, powers[i]!)) : all), big(1));
}

/** x^p by squaring; 1 where p is not positive. */
function power(x: BigNumber, p: number): BigNumber {
  if (p <= 0) return big(1);
  if (p === 1) return x;
  const root = power(x, Math.floor(p / 2));
  const square = root.times(root);
  return p % 2 === 0 ? square : square.times(x);
}

/** Where a monotone condition becomes true between 0 and `highest`, in which it holds. */
function bisect(holds: (distance: BigNumber) => boolean, highest: BigNumber): BigNumber {
  // the power of two first, from ever longer strides downwards
  let low = 1;
  while (holds(highest.times(big(2).pow(-low)))) low *= 2;
  let high = Math.floor(low / 2);
  while (low - high > 1) {
    const middle = Math.floor((low + high) / 2);
    if (holds(highest.times(big(2).pow(-middle)))) high = middle;
    else low = middle;
  }
  let lower = highest.times(big(2).pow(-low));
  let upper = highest.times(big(2).pow(-high));
  for (let i = 0; i < HALVINGS; i++) {
    const middle = lower.plus(upper).div(2);
    if (holds(middle)) upper = middle;
    else lower = middle;
  }
  return upper;
}
