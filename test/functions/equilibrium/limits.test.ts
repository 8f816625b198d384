import { describe, expect, it } from 'vitest';
import { amountsAtExtent, extentLimits } from '../../../functions/equilibrium/index.ts';

describe('extentLimits', () => {
  it('are where a product, or a reactant, is used up', () => {
    // N2 + 3 H2 = 2 NH3 with 1, 2, 1: by hand
    expect(extentLimits([-1, -3, 2], [1, 2, 1])).toEqual([-0.5, 2 / 3]);
  });

  it('are 0 and not -0 where a species is absent', () => {
    expect(extentLimits([-1, 1], [0, 0])).toEqual([0, 0]);
  });

  it('are infinite towards a side without species', () => {
    expect(extentLimits([1, 2], [1, 1])).toEqual([-0.5, Infinity]);
    expect(extentLimits([-1, -2], [1, 1])).toEqual([-Infinity, 0.5]);
  });

  it('lie apart from 0 where something is taken out, and cross where nothing is feasible', () => {
    expect(extentLimits([-1, 1], [2, -0.5])).toEqual([0.5, 2]);
    expect(extentLimits([-1, 1], [0.25, -0.5])).toEqual([0.5, 0.25]);
  });
});

describe('amountsAtExtent', () => {
  it('moves every amount by its coefficient', () => {
    expect(amountsAtExtent([-1, -3, 2], [1, 3, 0], 0.25)).toEqual([0.75, 2.25, 0.5]);
  });

  it('is exactly 0 at a limit that is no double', () => {
    const [, highest] = extentLimits([-49, 1], [1, 0]);
    expect(1 - 49 * highest).not.toBe(0);
    expect(amountsAtExtent([-49, 1], [1, 0], highest)).toEqual([0, highest]);
  });

  it('lets species that run out together be 0 together', () => {
    const [, highest] = extentLimits([-7, -14, 1], [0.1, 0.2, 0]);
    expect(amountsAtExtent([-7, -14, 1], [0.1, 0.2, 0], highest).slice(0, 2)).toEqual([0, 0]);
  });

  it('tells which of two runs out first when their quotients round to the same double', () => {
    // 0.3/3 and 0.1/1 both near 0.1; as doubles 3 x 0.1 exceeds 0.3 by 2^-55
    const feed = [0.3, 0.1];
    const [, highest] = extentLimits([-3, -1], feed);
    expect(amountsAtExtent([-3, -1], feed, highest)[0]).toBe(0);
    expect(amountsAtExtent([-3, -1], feed, highest)[1]).toBeCloseTo(2 ** -55 / 3, 30);
  });

  it('goes on beyond the limits, for the caller to refuse', () => {
    expect(amountsAtExtent([-1, 1], [1, 0], 1.5)).toEqual([-0.5, 1.5]);
  });
});
