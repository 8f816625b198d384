import { describe, expect, it } from 'vitest';
import { quotientCurve, solveExtent } from '../../../functions/equilibrium/index.ts';
import { problemOf } from './solve.ts';

describe('quotientCurve', () => {
  const problem = problemOf({ stoichiometry: [-1, -3, 2], feed: [1, 2, 0.5], lnK: 2 });
  const curve = quotientCurve(problem);

  it('rises from limit to limit', () => {
    expect(curve[0]).toEqual({ extent: -0.25, lnQ: -Infinity });
    expect(curve.at(-1)).toEqual({ extent: 2 / 3, lnQ: Infinity });
    for (let i = 1; i < curve.length; i++) {
      expect(curve[i]!.extent).toBeGreaterThan(curve[i - 1]!.extent);
      expect(curve[i]!.lnQ).toBeGreaterThan(curve[i - 1]!.lnQ);
    }
  });

  it('passes through ln K at the equilibrium', () => {
    const { extent } = solveExtent(problem);
    const above = curve.findIndex((point) => point.extent > extent);
    expect(curve[above]!.lnQ).toBeGreaterThan(2);
    expect(curve[above - 1]!.lnQ).toBeLessThan(2);
  });

  it('ends with a number where only a pure phase runs out', () => {
    const solid = problemOf({
      stoichiometry: [-1, 1],
      feed: [1, 0],
      mixed: [false, true],
      activity: 'amount',
      lnK: 0,
    });
    expect(quotientCurve(solid).at(-1)).toEqual({ extent: 1, lnQ: 0 });
  });

  it('is empty where nothing can react', () => {
    expect(quotientCurve(problemOf({ stoichiometry: [-1, 1], feed: [0, 0], lnK: 0 }))).toEqual([]);
  });
});
