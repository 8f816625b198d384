import { describe, expect, it } from 'vitest';
import { solve } from './solve.ts';

/** CaCO3(s) = CaO(s) + CO2(g), with its own gas alone at a fixed pressure. */
const lime = (feed: [number, number, number], lnK: number, inert = 0) =>
  solve({
    species: ['CaCO3(s)', 'CaO(s)', 'CO2(g)'],
    stoichiometry: [-1, 1, 1],
    feed,
    mixed: [false, false, true],
    inert,
    lnK,
  });

describe('a solid in nothing but its own gas at fixed pressure', () => {
  it('is used up above its decomposition pressure', () => {
    const { status, reason, extent, amounts, residual, limiting } = lime([1, 0.5, 0.25], 0.1);
    expect({ status, reason, extent, limiting }).toEqual({
      status: 'exhausted',
      reason: 'CaCO3(s) ran out',
      extent: 1,
      limiting: 0,
    });
    expect(amounts).toEqual([0, 1.5, 1.25]);
    expect(residual).toBeCloseTo(0.1, 15);
  });

  it('takes up all of the gas below it', () => {
    const { status, reason, amounts, lnAmounts } = lime([1, 0.5, 0.25], -0.1);
    expect({ status, reason }).toEqual({ status: 'exhausted', reason: 'the mixture phase ran out' });
    expect(amounts).toEqual([1.25, 0.25, 0]);
    expect(lnAmounts[2]).toBe(null);
  });

  it('takes up gas until the other solid is gone', () => {
    const { reason, amounts } = lime([1, 0.25, 0.5], -0.1);
    expect(reason).toBe('CaO(s) ran out');
    expect(amounts).toEqual([1.25, 0, 0.25]);
  });

  it('names all phases that run out together', () => {
    expect(lime([1, 0.25, 0.25], -0.1).reason).toBe('CaO(s) and the mixture phase ran out');
  });

  it('is in equilibrium at every extent exactly at it, and the feed stays', () => {
    const { status, reason, extent, amounts, residual } = lime([1, 0.5, 0.25], 0);
    expect(status).toBe('settled');
    expect(reason).toMatch(/^every extent between the limits is an equilibrium/);
    expect(extent).toBe(0);
    expect(amounts).toEqual([1, 0.5, 0.25]);
    expect(residual).toBe(0);
  });

  it('goes no farther than it must where something was taken out', () => {
    expect(lime([1, 0.5, -0.25], 0).amounts).toEqual([0.75, 0.75, 0]);
    expect(lime([-0.25, 0.5, 0.5], 0).amounts).toEqual([0, 0.25, 0.25]);
  });

  it('has an inner equilibrium as soon as an inert gas is there', () => {
    const { status, amounts } = lime([1, 0, 0.25], Math.log(0.5), 0.5);
    expect(status).toBe('settled');
    expect(amounts[2]).toBeCloseTo(0.5, 14); // x = 1/2 beside 0.5 inert
  });
});

describe('a gas of several products of one solid', () => {
  const salt = { species: ['S(s)', 'A(g)', 'B(g)'], stoichiometry: [-1, 1, 1], mixed: [false, true, true] };

  it('keeps its composition: K = 1/4 is exactly met at every extent', () => {
    expect(solve({ ...salt, feed: [1, 0.1, 0.1], lnK: Math.log(0.25) }).reason).toMatch(/^every extent/);
  });

  it('vanishes as a whole below that, and uses up the solid above', () => {
    expect(solve({ ...salt, feed: [1, 0, 0], lnK: Math.log(0.2) }).reason).toBe('the mixture phase ran out');
    expect(solve({ ...salt, feed: [1, 0, 0], lnK: Math.log(0.3) }).reason).toBe('S(s) ran out');
  });

  it('does not once the ratio is another', () => {
    const { status, amounts } = solve({ ...salt, feed: [1, 0.1, 0.2], lnK: Math.log(0.24) });
    expect(status).toBe('settled');
    const [, a, b] = amounts;
    expect((a! * b!) / (a! + b!) / (a! + b!)).toBeCloseTo(0.24, 14);
  });
});

describe('pure phases beside a mixture', () => {
  it('that are absent products appear when the affinity calls for them', () => {
    // A(g) + B(g) = S(s) at P = p0, K = 100
    const { status, amounts } = solve({
      stoichiometry: [-1, -1, 1],
      feed: [1, 1.5, 0],
      mixed: [true, true, false],
      lnK: Math.log(100),
    });
    expect(status).toBe('settled');
    expect(amounts[2]).toBeGreaterThan(0);
  });

  it('that are absent products stay away when it does not: exhausted from the start', () => {
    const { status, reason, extent, amounts, residual } = solve({
      stoichiometry: [-1, -1, 1],
      feed: [1, 1, 0],
      mixed: [true, true, false],
      lnK: 0,
      inert: 1,
    });
    expect({ status, reason, extent }).toEqual({ status: 'exhausted', reason: 'C ran out', extent: 0 });
    expect(amounts).toEqual([1, 1, 0]);
    expect(residual).toBeCloseTo(Math.log(9), 14); // Q = 1/(1/3)^2
  });

  it('alone are decided by K: all of one, all of the other, or any at K = 1', () => {
    const graphite = { stoichiometry: [-1, 1], feed: [2, 1], mixed: [false, false] };
    expect(solve({ ...graphite, lnK: 1e-9 }).amounts).toEqual([0, 3]);
    expect(solve({ ...graphite, lnK: -1e-9 }).amounts).toEqual([3, 0]);
    expect(solve({ ...graphite, lnK: 0 }).amounts).toEqual([2, 1]);
  });

  it('settle exactly where they run out when K is met there', () => {
    // S(s) = A(g) in a volume, a = n: K = 1.5 is reached as the last of the solid goes
    const { status, amounts } = solve({
      stoichiometry: [-1, 1],
      feed: [1, 0.5],
      mixed: [false, true],
      activity: 'amount',
      lnK: Math.log(1.5),
    });
    expect(status).toBe('settled');
    expect(amounts).toEqual([0, 1.5]);
  });
});

describe('a feed that cannot react', () => {
  it('is blocked by the absent species, which are named', () => {
    const { status, reason, extent, amounts, residual, limiting } = solve({
      stoichiometry: [-1, -1, 1],
      feed: [0, 1, 0],
      lnK: 3,
    });
    expect({ status, extent, residual, limiting }).toEqual({
      status: 'blocked',
      extent: 0,
      residual: null,
      limiting: null,
    });
    expect(reason).toBe('A and C are both at 0, so that neither direction is open');
    expect(amounts).toEqual([0, 1, 0]);
  });

  it('is blocked by absent pure phases too', () => {
    expect(lime([0, 0, 1], 3).status).toBe('blocked');
  });
});
