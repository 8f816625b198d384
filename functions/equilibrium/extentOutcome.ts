/** The outcome of a one-reaction problem, read off the terms where the solver left them. */
import { SMALLEST_NORMAL, timesPowerOfTwo } from '../numerics/binary.ts';
import type { ExtentProblem } from './extentProblem.ts';
import type { Terms } from './extentTerms.ts';
import type { Outcome, Status } from './outcome.ts';

export interface ExtentOutcome extends Outcome {
  readonly kind: 'extent';
  readonly problem: ExtentProblem;
  /** In the unit of the feed; forward is positive. */
  readonly extent: number;
  /** The smallest and the largest feasible extent. */
  readonly limits: Limits;
  /** Each to full relative precision, 0 only where nothing is left or it underflows. Empty when refused. */
  readonly amounts: readonly number[];
  /** Their natural logarithms, which do not underflow; null for an exact zero. */
  readonly lnAmounts: readonly (number | null)[];
  /** The species that would run out first in the direction that the reaction takes, or did run out. */
  readonly limiting: number | null;
  /** What rounding may have done to the residual, in ln units. */
  readonly errorBound: number | null;
}

type Limits = readonly [lowest: number, highest: number];

/** The limits, and the species that set them. */
export interface Range {
  readonly product: number;
  readonly reactant: number;
  readonly limits: Limits;
}

/** Where a solution ended: at the extent x from the point of expansion, x = unit 2^exponent. */
export interface Ending {
  readonly status: Status;
  readonly reason: string;
  readonly unit: number;
  readonly exponent: number;
  readonly x: number;
  readonly f: number | null;
  readonly evaluations: number;
}

/** No answer, and why. */
export function refusal(problem: ExtentProblem, reason: string, limits: Limits): ExtentOutcome {
  return {
    kind: 'extent',
    status: 'refused',
    reason,
    problem,
    residual: null,
    iterations: 0,
    extent: 0,
    limits,
    amounts: [],
    lnAmounts: [],
    limiting: null,
    errorBound: null,
  };
}

/** The outcome at `ending`. */
export function report(problem: ExtentProblem, range: Range, terms: Terms, ending: Ending): ExtentOutcome {
  const { base, rate, position } = terms;
  const { unit, exponent, x, f } = ending;
  let { status, reason } = ending;
  const count = problem.species.length;
  const amounts = new Array<number>(count);
  const lnAmounts = new Array<number | null>(count);
  for (let i = 0; i < count; i++) {
    const at = position[i]!;
    const power = base[at] === 0 ? exponent : 0;
    const scaled = base[at] === 0 ? rate[at]! * unit + 0 : base[at]! + rate[at]! * x;
    const amount = timesPowerOfTwo(scaled, power);
    amounts[i] = amount;
    lnAmounts[i] = scaled === 0 ? null : Math.log(scaled) + power * Math.LN2;
    if (amount < SMALLEST_NORMAL && scaled !== 0 && status === 'settled') status = 'at limit';
  }

  const extent = terms.origin + x;
  const run = terms.origin === 0 ? unit : extent; // the extent itself may underflow
  let limiting = run > 0 ? range.reactant : run < 0 ? range.product : null;
  if (status === 'exhausted') {
    reason = `${exhausted(problem, amounts)} ran out`;
    limiting = amounts[range.reactant] === 0 ? range.reactant : range.product;
  }
  return {
    kind: 'extent',
    status,
    reason,
    problem,
    residual: f === null ? null : Math.abs(f),
    iterations: ending.evaluations,
    extent,
    limits: range.limits,
    amounts,
    lnAmounts,
    limiting,
    errorBound: f === null ? null : terms.bound,
  };
}

/** The phases of which nothing is left. */
function exhausted(problem: ExtentProblem, amounts: readonly number[]): string {
  const phases = problem.species.filter((_, i) => !problem.mixed[i] && amounts[i] === 0);
  const isMixtureGone =
    problem.inert === 0 && problem.mixed.every((isMixed, i) => !isMixed || amounts[i] === 0);
  if (isMixtureGone && problem.mixed.includes(true)) phases.push('the mixture phase');
  return phases.join(' and ');
}
