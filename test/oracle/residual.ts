/** ln(Q/K) at given amounts, to 50 digits. */
import type { ExtentProblem } from '../../functions/equilibrium/index.ts';
import { exactNumber } from './extentOracle.ts';

export function residualInFiftyDigits(problem: ExtentProblem, amounts: readonly number[]): number {
  const { stoichiometry, mixed, activity, inert, lnScale, lnK } = problem;
  const exact = amounts.map(exactNumber);
  const total = exact.reduce((sum, n, i) => (mixed[i] ? sum.plus(n) : sum), exactNumber(inert));
  const divisor = activity === 'fraction' ? total : exactNumber(1);
  return exact
    .reduce((sum, n, i) => {
      if (!mixed[i]) return sum;
      const lnActivity = n.div(divisor).ln().plus(exactNumber(lnScale));
      return sum.plus(exactNumber(stoichiometry[i]!).times(lnActivity));
    }, exactNumber(-lnK))
    .toNumber();
}
