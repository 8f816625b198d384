/**
 * What a solver returns: never a bare number, and never a wrong number with a good status.
 *
 * An outcome can be written to JSON and read back without loss. It carries the problem as it was
 * solved, so that the answer can be worked again by other means from the outcome alone.
 */

/** How a solution ended. Only the first two carry an answer that balances every affinity. */
export type Status =
  /** The affinity is zero within its rounding bound. */
  | 'settled'
  /** Settled, but an amount is too small to be held as a number; its logarithm is still given. */
  | 'at limit'
  /** A phase ran out before equilibrium was reached: the affinity still points outward. */
  | 'exhausted'
  /** Nothing can react: a reactant and a product are absent, or the feed leaves no room. */
  | 'blocked'
  /** No answer is given, for the stated reason. */
  | 'refused'
  /** The solver reached its limit of iterations; the best point is given, and it is not an answer. */
  | 'out of time';

export interface Outcome {
  /** Which solver made it, and so how the problem and the solution are to be read. */
  readonly kind: string;
  readonly status: Status;
  /** The phase that ran out, the species that is absent, why it was refused; empty when plainly settled. */
  readonly reason: string;
  /** The problem as it was solved. */
  readonly problem: object;
  /** Largest affinity left over among the reactions, abs(ln(Q/K)); null where it has no number. */
  readonly residual: number | null;
  readonly iterations: number;
}

/** Whether the outcome carries amounts that a calculation may go on with. */
export function hasAnswer(outcome: Outcome): boolean {
  return outcome.status !== 'refused' && outcome.status !== 'out of time';
}
