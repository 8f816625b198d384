/** What is wrong with an outcome, as far as it can be told from the outcome alone. */
import type { ExtentOutcome } from '../../../functions/equilibrium/index.ts';

/**
 * An amount is rounded at most four times on its way from the feed, a product of an amount and a
 * coefficient once more; both sides of the comparison together fewer than 12 times.
 */
const CONSERVED = 12 * Number.EPSILON;
/** Smaller numbers do not have all their bits. */
const SMALLEST_NORMAL = 2 ** -1022;

export function flawsOf(outcome: ExtentOutcome): string[] {
  const { status, problem, extent, limits, amounts, lnAmounts, residual, errorBound } = outcome;
  const { stoichiometry: nu, feed } = problem;
  const flaws: string[] = [];
  const check = (isSound: boolean, flaw: string) => {
    if (!isSound) flaws.push(`${flaw}: ${JSON.stringify(outcome)}`);
  };
  check(status !== 'refused' && status !== 'out of time', `is ${status}`);
  check(limits[0] <= extent && extent <= limits[1], 'the extent is beyond its limits');
  if (status === 'settled' || status === 'at limit')
    check(residual! <= errorBound!, 'the residual is beyond its bound');
  if (status === 'exhausted') check(residual! > errorBound!, 'the affinity is zero');

  amounts.forEach((n, i) => {
    check(n >= 0 && Number.isFinite(n), 'an amount is negative or no number');
    check(
      n < SMALLEST_NORMAL || Math.abs(Math.log(n) - lnAmounts[i]!) < 1e-12,
      'a logarithm belongs to another amount',
    );
    // n_i nu_0 - n_0 nu_i is the same before and after
    const size = [n, feed[i]!]
      .map((x) => Math.abs(x * nu[0]!))
      .concat([amounts[0]!, feed[0]!].map((x) => Math.abs(x * nu[i]!)));
    const change = (n - feed[i]!) * nu[0]! - (amounts[0]! - feed[0]!) * nu[i]!;
    check(
      Math.abs(change) <= Math.max(CONSERVED * Math.max(...size), SMALLEST_NORMAL),
      'the reaction is not conserved',
    );
  });
  return flaws;
}
