/**
 * The one-reaction solver against its own logarithms and exponentials, and against a textbook root
 * finder on the same function.
 */
import { solveExtent, type ExtentProblem } from '../../functions/equilibrium/index.ts';
import { seededRandom } from '../../test/random/xorshift.ts';
import { atLeast, atMost, forComparison, type Row } from '../benchRow.ts';
import { shortestSeconds } from '../timing.ts';
import { plain, solversOwn } from './solver/affinity.ts';
import { solveByBisection } from './solver/bisection.ts';
import { solveByBrent } from './solver/brent.ts';
import { recordedArguments } from './solver/recordedArguments.ts';

const PROBLEMS = 1000;
const ROUNDS = 200;
/** A=B+C at ln K = 62 leaves of 1 mol of A this much: x_B = x_C = 1/2 to 28 digits, N = 2. */
const TRACE: ExtentProblem = {
  species: ['A', 'B', 'C'],
  stoichiometry: [-1, 1, 1],
  feed: [1, 0, 0],
  mixed: [true, true, true],
  activity: 'fraction',
  lnScale: 0,
  inert: 0,
  lnK: 62,
};
const TRACE_OF_A = Math.exp(-62) / 2;

export async function rows(): Promise<Row[]> {
  const problems = fourSpeciesProblems(12);
  const { logarithms, exponentials } = await recordedArguments(problems);
  const { solving, functions } = shortestSeconds(
    {
      solving: () => total(problems, solve),
      functions: () => total(logarithms, Math.log) + total(exponentials, Math.exp),
    },
    ROUNDS,
  );
  const ours = Math.abs(solveExtent(TRACE).amounts[0]! / TRACE_OF_A - 1);
  const theirs = Math.abs((TRACE.feed[0]! - solveByBisection(TRACE, solversOwn)) / TRACE_OF_A - 1);
  return [
    atMost(8, 'a solve, abs ln K < 12, against its own logarithms and exponentials', solving / functions),
    ...[12, 100, 690].flatMap(againstTextbook),
    atMost(1e-14, 'relative error of a trace of 6e-28', ours, ''),
    atLeast(1e-3, 'the same by bisection in extent', theirs, ''),
  ];
}

/**
 * The textbook's root finder that brackets, bisection, on the solver's own function, in the extent and
 * to its last bit. Beside it Brent's method, the best known of its kind, on the same function and on
 * the textbook's plain formula, which is cheaper and less exact.
 */
function againstTextbook(lnK: number): Row[] {
  const problems = fourSpeciesProblems(lnK);
  const { solving, bisecting, brent, plainBrent } = shortestSeconds(
    {
      solving: () => total(problems, solve),
      bisecting: () => total(problems, (problem) => solveByBisection(problem, solversOwn)),
      brent: () => total(problems, (problem) => solveByBrent(problem, solversOwn)),
      plainBrent: () => total(problems, (problem) => solveByBrent(problem, plain)),
    },
    ROUNDS,
  );
  const where = `abs ln K < ${lnK}, against a solve`;
  return [
    atLeast(3, `bisection, ${where}`, bisecting / solving),
    forComparison(`Brent's method, ${where}`, brent / solving),
    forComparison(`Brent's method on the plain formula, ${where}`, plainBrent / solving),
  ];
}

function solve(problem: ExtentProblem): number {
  return solveExtent(problem).extent;
}

const REACTIONS = [
  [-1, -1, 1, 1],
  [-1, -1, 2, 1],
  [-1, -3, 2, 1],
  [-2, -1, 2, 1],
  [-1, -1, 1, 3],
  [-1, -2, 1, 1],
];

/** Four species, amounts over three decades, one in seven of them 0. */
function fourSpeciesProblems(lnK: number): ExtentProblem[] {
  const random = seededRandom(1);
  const problems: ExtentProblem[] = [];
  while (problems.length < PROBLEMS) {
    const feed = Array.from({ length: 4 }, () =>
      random.chance(1 / 7) ? 0 : 10 ** random.between(-1.5, 1.5),
    ) as [number, number, number, number];
    const isBlocked = feed[0] * feed[1] === 0 && feed[2] * feed[3] === 0;
    if (isBlocked) continue;
    problems.push({
      species: ['A', 'B', 'C', 'D'],
      stoichiometry: REACTIONS[problems.length % REACTIONS.length]!,
      feed,
      mixed: [true, true, true, true],
      activity: 'fraction',
      lnScale: random.between(0, 3),
      inert: random.number(),
      lnK: random.between(-lnK, lnK),
    });
  }
  return problems;
}

function total<Item>(items: Iterable<Item>, of: (item: Item) => number): number {
  let sum = 0;
  for (const item of items) sum += of(item);
  return sum;
}
