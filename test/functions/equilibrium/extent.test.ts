import { describe, expect, it } from 'vitest';
import { relativeError, solve } from './solve.ts';

/**
 * Amounts come with a relative error of a few roundings (measured: below 1e-14), of which the
 * expected value, worked in doubles, has as many of its own.
 */
const FULL = 2e-14;

describe('what goes wrong by hand', () => {
  // invented scenarios; the first hand-made value of each pair is what a plain sheet gives

  it('takes the feasible root: not 2.395, where A is negative', () => {
    const { extent, amounts } = solve({
      stoichiometry: [-1, -1, 2],
      feed: [1, 1.8, 0.2],
      activity: 'amount',
      lnK: Math.log(30),
    });
    // (0.2 + 2x)^2 = 30 (1 - x)(1.8 - x): 26 x^2 - 84.8 x + 53.96 = 0, its smaller root
    const root = (84.8 - Math.sqrt(84.8 * 84.8 - 4 * 26 * 53.96)) / 52;
    expect(extent).toBeCloseTo(0.86655, 5);
    expect(relativeError(extent, root)).toBeLessThan(FULL);
    expect(Math.min(...amounts)).toBeGreaterThan(0);
  });

  it('keeps a trace that 1 - extent loses', () => {
    const { extent, amounts } = solve({ stoichiometry: [-1, 1, 1], feed: [1, 0, 0], lnK: 62 });
    expect(1 - extent).toBe(0);
    // x_B x_C / x_A = K with x_B = x_C = 1/2 to 28 digits, N = 2: n_A = 2 (1/4) e^-62
    expect(relativeError(amounts[0]!, Math.exp(-62) / 2)).toBeLessThan(FULL);
  });

  it('keeps a small extent that cancellation loses', () => {
    const lnK = Math.log(2e-18);
    const { extent } = solve({ stoichiometry: [-1, 1, 1], feed: [1, 0, 0.35], activity: 'amount', lnK });
    // x (0.35 + x) = 2e-18 (1 - x); x is 5.714e-18 and 1 to 17 digits
    expect(relativeError(extent, 2e-18 / 0.35)).toBeLessThan(FULL);
  });

  it('finds both traces of an exact 2:1 feed, not X = Y = 0', () => {
    const { amounts } = solve({ stoichiometry: [-2, -1, 1], feed: [2, 1, 0], lnK: 40 });
    expect(amounts[1]).toBeCloseTo(1.0203e-6, 10);
    expect(amounts[0]).toBeCloseTo(2.0406e-6, 10);
    expect(relativeError(amounts[0]!, 2 * amounts[1]!)).toBeLessThan(FULL);
  });

  it('lets the total amount change: 0.4018, and 0.7251 beside 4 inert, not 0.2875', () => {
    const given = { stoichiometry: [-1, 3], feed: [1, 0], lnK: Math.log(0.9) };
    expect(solve(given).extent).toBeCloseTo(0.4018, 4);
    expect(solve({ ...given, inert: 4 }).extent).toBeCloseTo(0.7251, 4);
  });

  it('stops where the solid is used up: 0.2744 bar, not 0.75 bar from -0.0208 mol', () => {
    // 0.012 mol MX(s) = M(g) in 4 L at 1100 K, K = 0.75 bar; R in L bar/(mol K), CODATA 2018
    const perMole = (0.08314462618 * 1100) / 4;
    const { status, reason, amounts } = solve({
      species: ['MX(s)', 'M(g)'],
      stoichiometry: [-1, 1],
      feed: [0.012, 0],
      mixed: [false, true],
      activity: 'amount',
      lnScale: Math.log(perMole),
      lnK: Math.log(0.75),
    });
    expect(status).toBe('exhausted');
    expect(reason).toBe('MX(s) ran out');
    expect(amounts[0]).toBe(0);
    expect(amounts[1]! * perMole).toBeCloseTo(0.2744, 4);
  });
});

describe('problems with a solution in closed form', () => {
  it.each([-30, -3, 0, 0.7, 25, 200])('isomerisation, ln K = %d: x = (K a - b)/(1 + K)', (lnK) => {
    const { amounts } = solve({ stoichiometry: [-1, 1], feed: [2, 0.5], lnK });
    // n_A = 2.5/(1 + K), n_B = 2.5/(1 + 1/K)
    expect(relativeError(amounts[0]!, 2.5 / (1 + Math.exp(lnK)))).toBeLessThan(FULL);
    expect(relativeError(amounts[1]!, 2.5 / (1 + Math.exp(-lnK)))).toBeLessThan(FULL);
  });

  it.each([-40, -1, 3, 20])('dissociation at fixed pressure, ln K = %d: x = sqrt(K/(K + 4P))', (lnK) => {
    const { extent } = solve({ stoichiometry: [-1, 2], feed: [1, 0], lnScale: Math.log(3), lnK });
    const K = Math.exp(lnK);
    expect(relativeError(extent, Math.sqrt(K / (K + 12)))).toBeLessThan(FULL);
  });

  it.each([-40, -1, 3, 20])('weak acid, ln K = %d: positive root of x^2 + K x - K c = 0', (lnK) => {
    const { amounts } = solve({ stoichiometry: [-1, 1, 1], feed: [0.1, 0, 0], activity: 'amount', lnK });
    const K = Math.exp(lnK);
    const x = (0.2 * K) / (K + Math.sqrt(K * K + 0.4 * K));
    expect(relativeError(amounts[1]!, x)).toBeLessThan(FULL);
    expect(relativeError(amounts[0]!, (x * x) / K)).toBeLessThan(FULL);
  });

  it('water-gas shift at K = 1 from equal amounts: the exact middle', () => {
    const { extent, residual } = solve({ stoichiometry: [-1, -1, 1, 1], feed: [1, 1, 0, 0], lnK: 0 });
    expect(extent).toBe(0.5);
    expect(residual).toBe(0);
  });

  it('a feed at equilibrium stays, and nothing is limiting', () => {
    const { extent, limiting } = solve({ stoichiometry: [-1, -1, 2], feed: [1, 1, 2], lnK: Math.log(4) });
    expect(extent).toBe(0);
    expect(limiting).toBe(null);
  });
});

describe('limits of K and of amounts', () => {
  it.each([-1500, 1500])('ln K = %d: the amount underflows, its logarithm does not', (lnK) => {
    const { status, amounts, lnAmounts } = solve({ stoichiometry: [-1, 1], feed: [1, 0.5], lnK });
    const trace = lnK < 0 ? 1 : 0;
    expect(status).toBe('at limit');
    expect(amounts[trace]).toBe(0);
    expect(amounts[1 - trace]).toBe(1.5);
    // ln 1.5 - 1500, rounded to 2^-42
    expect(Math.abs(lnAmounts[trace]! - (Math.log(1.5) - 1500))).toBeLessThan(1e-12);
  });

  it('an amount just inside the normal range is settled to full precision, one below is at limit', () => {
    const at = (lnK: number) => solve({ stoichiometry: [-1, 1], feed: [1, 0], lnK });
    expect(at(-708).status).toBe('settled');
    // ln n is lnK but for e^-708; exp of a rounded 708 is good to 2^-44, exp of -708 itself to a rounding
    expect(relativeError(at(-708).amounts[1]!, Math.exp(-708))).toBeLessThan(FULL);
    expect(at(-709).status).toBe('at limit');
    expect(at(-709).amounts[1]).toBeGreaterThan(0);
  });

  it('a trace in the feed counts as itself beside 1e30 times as much', () => {
    const { amounts } = solve({
      stoichiometry: [-1, -1, 1],
      feed: [1e15, 1e-15, 0],
      activity: 'amount',
      lnK: -30,
    });
    // n_C/(n_B) = K n_A with n_A = 1e15 to 30 digits
    const ratio = Math.exp(-30) * 1e15;
    expect(relativeError(amounts[1]!, 1e-15 / (1 + ratio))).toBeLessThan(FULL);
    expect(relativeError(amounts[2]!, 1e-15 / (1 + 1 / ratio))).toBeLessThan(FULL);
  });

  it('an absent reactant that nothing blocks forms again', () => {
    const { extent, amounts, limiting } = solve({ stoichiometry: [-1, -1, 1], feed: [0, 1, 1], lnK: 0 });
    expect(extent).toBeLessThan(0);
    expect(amounts[0]).toBeGreaterThan(0);
    expect(limiting).toBe(2);
  });

  it('coefficients that are thirds are as good as whole ones', () => {
    const thirds = solve({ stoichiometry: [-1 / 3, 1 / 3, 1 / 3], feed: [1, 0, 0], lnK: 100 / 3 });
    const whole = solve({ stoichiometry: [-1, 1, 1], feed: [1, 0, 0], lnK: 100 });
    // 1/3 and 100/3 are each a rounding off: 2^-53 of ln K, three times as much in ln n
    expect(relativeError(thirds.amounts[0]!, whole.amounts[0]!)).toBeLessThan(3 * 100 * Number.EPSILON);
  });
});

describe('what was taken out', () => {
  it('is made up for by the reaction where that is feasible', () => {
    const { status, extent, limits, amounts } = solve({
      stoichiometry: [-1, -1, 1],
      feed: [2, 1, -0.5],
      lnK: 3,
    });
    expect(status).toBe('settled');
    expect(limits).toEqual([0.5, 1]);
    expect(extent).toBeGreaterThan(0.5);
    expect(Math.min(...amounts)).toBeGreaterThan(0);
  });

  it('is refused where no extent makes up for it', () => {
    const { status, reason, amounts } = solve({ stoichiometry: [-1, -1, 1], feed: [2, 0.1, -0.5], lnK: 3 });
    expect(status).toBe('refused');
    expect(reason).toBe('no extent leaves both B and C at 0 or more');
    expect(amounts).toEqual([]);
  });
});
