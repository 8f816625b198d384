/** Random one-reaction problems: wide ranges, exact zeros, exact ties, pure phases, inert, removal. */
import type { ExtentProblem } from '../../functions/equilibrium/index.ts';
import type { Random } from './xorshift.ts';

export interface Spread {
  /** ln K is uniform up to this size. */
  readonly lnK: number;
  /** Amounts are log-uniform over this many decades. */
  readonly decades: number;
}

export function randomExtentProblem(random: Random, { lnK, decades }: Spread): ExtentProblem {
  const reactants = random.whole(1, 3);
  const products = random.whole(1, 3);
  const hasPure = random.chance(0.3);
  const amount = () => 10 ** random.between(-decades / 2, decades / 2);
  const size = () => (random.chance(0.15) ? random.whole(1, 5) / 2 : random.whole(1, 3));

  const stoichiometry = Array.from(
    { length: reactants + products },
    (_, i) => (i < reactants ? -1 : 1) * size(),
  );
  const feed = stoichiometry.map(() => (random.chance(0.2) ? 0 : amount()));
  if (random.chance(0.15)) makeTie(stoichiometry, feed, amount());
  if (random.chance(0.1)) runBeforehand(random, stoichiometry, feed);
  return {
    species: stoichiometry.map((_, i) => `S${i}`),
    stoichiometry,
    feed,
    mixed: stoichiometry.map(() => !(hasPure && random.chance(0.4))),
    activity: random.chance(0.5) ? 'fraction' : 'amount',
    lnScale: random.chance(0.3) ? 0 : random.between(-5, 5),
    inert: random.chance(0.6) ? 0 : amount(),
    lnK: random.between(-lnK, lnK),
  };
}

/** All reactants in the ratio of their coefficients, so that they run out together. */
function makeTie(stoichiometry: readonly number[], feed: number[], amount: number): void {
  stoichiometry.forEach((nu, i) => {
    if (nu < 0) feed[i] = -nu * amount;
  });
}

/** Takes some product out, beyond what is there, so that the reaction has to run forward first. */
function runBeforehand(random: Random, stoichiometry: readonly number[], feed: number[]): void {
  const reach = Math.min(...feed.map((n, i) => (stoichiometry[i]! < 0 ? -n / stoichiometry[i]! : Infinity)));
  if (reach === 0) return;
  const i = stoichiometry.findIndex((nu) => nu > 0);
  feed[i] = -reach * stoichiometry[i]! * random.between(0, 0.9);
}
