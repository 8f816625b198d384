import { describe, expect, it } from 'vitest';
import { solveExtent, type ExtentProblem } from '../../../functions/equilibrium/index.ts';
import { problemOf } from './solve.ts';

const sound = problemOf({ stoichiometry: [-1, -1, 2], feed: [1, 2, 0], lnK: 1 });

describe('a problem that makes no sense is refused, with the reason', () => {
  it.each<[string, Partial<ExtentProblem>]>([
    ['differ in length', { feed: [1, 2] }],
    ['differ in length', { species: ['A'] }],
    ['the kind of activity is unknown', { activity: 'molality' as 'amount' }],
    ['ln K is not within 1500 of 0', { lnK: 1500.1 }],
    ['ln K is not within 1500 of 0', { lnK: NaN }],
    ['lnScale is not within 1500 of 0', { lnScale: -Infinity }],
    ['the inert amount is not 0 or between', { inert: -1 }],
    ['the inert amount is not 0 or between', { inert: NaN }],
    ['the coefficient of B is not between 0.001 and 500', { stoichiometry: [-1, 0, 2] }],
    ['the coefficient of B is not between 0.001 and 500', { stoichiometry: [-1, NaN, 2] }],
    ['the coefficient of C is not between 0.001 and 500', { stoichiometry: [-1, -1, Infinity] }],
    ['the coefficients sum to more than 500', { stoichiometry: [-300, -1, 300] }],
    ['the phase of A is neither mixed nor pure', { mixed: ['g', true, true] as never }],
    ['the amount of A is not 0 or between', { feed: ['1', 2, 0] as never }],
    ['the amount of C is not 0 or between', { feed: [1, 2, NaN] }],
    ['the amount of C is not 0 or between', { feed: [1, 2, Infinity] }],
    ['the amount of C is not 0 or between', { feed: [1, 2, 1e-300] }],
    ['lacks a reactant or a product', { stoichiometry: [1, 1, 2] }],
    ['lacks a reactant or a product', { species: [], stoichiometry: [], feed: [], mixed: [] }],
    ['no extent leaves both A and C at 0 or more', { feed: [1, 2, -2.5] }],
  ])('%s: %o', (reason, wrong) => {
    const outcome = solveExtent({ ...sound, ...wrong });
    expect(outcome.status).toBe('refused');
    expect(outcome.reason).toContain(reason);
    expect(outcome.amounts).toEqual([]);
    expect(outcome.residual).toBe(null);
  });

  it('and the sound one is not', () => {
    expect(solveExtent(sound).status).toBe('settled');
  });
});
