import { describe, expect, it } from 'vitest';
import { direction, reactionQuotient, solveExtent } from '../../../functions/equilibrium/index.ts';
import { randomExtentProblem } from '../../random/extentProblem.ts';
import { seededRandom } from '../../random/xorshift.ts';
import { problemOf } from './solve.ts';

const water = { stoichiometry: [-1, -1, 2], lnK: Math.log(54.3) };

describe('reactionQuotient', () => {
  it('is that of the amounts as they are given', () => {
    // H2 + I2 = 2 HI: 0.0224^2/(0.00623 x 0.00414) = 19.45, Chang, Chemistry, example 14.10 (from memory)
    const { lnQ } = reactionQuotient(
      problemOf({ ...water, feed: [0.00623, 0.00414, 0.0224], activity: 'amount' }),
    );
    expect(Math.exp(lnQ!)).toBeCloseTo(19.45, 2);
  });

  it('takes fractions of the mixture with its inert part, and the scale once for each mole made', () => {
    const { lnQ } = reactionQuotient(
      problemOf({ stoichiometry: [-1, 2], feed: [1, 1], inert: 2, lnScale: Math.log(3), lnK: 0 }),
    );
    expect(Math.exp(lnQ!)).toBeCloseTo((1 / 16 / (1 / 4)) * 3, 14);
  });

  it('has no number where a mixed species is absent, and says which', () => {
    const { lnQ, absentReactants, absentProducts } = reactionQuotient(
      problemOf({ ...water, feed: [0, 1, 0] }),
    );
    expect({ lnQ, absentReactants, absentProducts }).toEqual({
      lnQ: null,
      absentReactants: [0],
      absentProducts: [2],
    });
  });

  it('does not mind an absent pure phase', () => {
    const { lnQ } = reactionQuotient(
      problemOf({
        stoichiometry: [-1, 1, 1],
        feed: [0, 0, 2],
        mixed: [false, false, true],
        activity: 'amount',
        lnK: 0,
      }),
    );
    expect(lnQ).toBeCloseTo(Math.LN2, 15);
  });
});

describe('direction', () => {
  const of = (feed: number[], lnK = Math.log(4)) =>
    direction(problemOf({ stoichiometry: [-1, -1, 2], feed, lnK }));
  const solid = (feed: number[], lnK: number) =>
    direction(problemOf({ stoichiometry: [-1, 1], feed, mixed: [false, true], activity: 'amount', lnK }));

  it('is the sign of ln(K/Q)', () => {
    expect(of([1, 1, 1])).toBe('forward');
    expect(of([1, 1, 3])).toBe('reverse');
  });

  it('is equilibrium within rounding, and no farther', () => {
    expect(of([1, 1, 2])).toBe('at equilibrium');
    expect(of([0.1, 0.1, 0.2])).toBe('at equilibrium');
    expect(of([1, 1, 2 * (1 + 1e-14)])).toBe('reverse');
  });

  it('follows from what is absent', () => {
    expect(of([1, 1, 0])).toBe('forward');
    expect(of([0, 1, 1])).toBe('reverse');
    expect(of([0, 1, 0])).toBe('blocked');
    expect(of([1, 1, -0.5])).toBe('forward');
  });

  it('is exhausted where a pure phase is missing on the side that would be used up', () => {
    expect(solid([0, 1], 1)).toBe('exhausted');
    expect(solid([0, 1], -1)).toBe('reverse');
    expect(solid([1, 1], 1)).toBe('forward');
    expect(solid([1, 0], -1)).toBe('forward');
    expect(solid([0, 0], 1)).toBe('blocked');
  });

  it('agrees with the sign of the extent', () => {
    const random = seededRandom(3);
    for (let i = 0; i < 2000; i++) {
      const problem = randomExtentProblem(random, { lnK: 100, decades: 20 });
      if (problem.feed.some((n) => n < 0)) continue;
      const { status, extent, reason, lnAmounts } = solveExtent(problem);
      const found = direction(problem);
      if (reason.startsWith('every')) expect(found).toBe('at equilibrium');
      else if (status === 'blocked') expect(found).toBe('blocked');
      else if (status === 'exhausted' && extent === 0) expect(found).toBe('exhausted');
      else if (found === 'forward') expect(extent).toBeGreaterThanOrEqual(0);
      else if (found === 'reverse') expect(extent).toBeLessThanOrEqual(0);
      else expect(found, JSON.stringify({ problem, lnAmounts })).toBe('at equilibrium');
    }
  });
});
