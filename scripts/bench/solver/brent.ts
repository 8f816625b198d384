/**
 * The textbook way: Brent's root finder on ln Q - ln K as a function of the extent.
 *
 * Source: Brent, Algorithms for Minimization without Derivatives (1973), chapter 4, procedure zero.
 */
import { extentLimits, type ExtentProblem } from '../../../functions/equilibrium/index.ts';
import type { Affinity } from './affinity.ts';

/** The extent, to the last bit that Brent's own tolerance allows; all species mixed, mole fractions. */
export function solveByBrent(problem: ExtentProblem, affinity: Affinity): number {
  const [lowest, highest] = extentLimits(problem.stoichiometry, problem.feed);
  return brent(affinity(problem), lowest, highest);
}

function brent(f: (x: number) => number, lower: number, upper: number): number {
  let [a, b] = [lower, upper];
  let [fa, fb] = [f(a), f(b)];
  let [c, fc] = [a, fa];
  let d = b - a;
  let e = d;
  for (;;) {
    if (fb > 0 === fc > 0) {
      [c, fc] = [a, fa];
      d = e = b - a;
    }
    if (Math.abs(fc) < Math.abs(fb)) {
      [a, b, c] = [b, c, b];
      [fa, fb, fc] = [fb, fc, fb];
    }
    const tolerance = 2 * Number.EPSILON * Math.abs(b);
    const m = (c - b) / 2;
    if (Math.abs(m) <= tolerance || fb === 0) return b;
    const isInterpolable = Math.abs(e) >= tolerance && Math.abs(fa) > Math.abs(fb) && Number.isFinite(fa);
    if (isInterpolable) {
      const s = fb / fa;
      let p: number;
      let q: number;
      if (a === c) {
        p = 2 * m * s;
        q = 1 - s;
      } else {
        const r = fb / fc;
        const t = fa / fc;
        p = s * (2 * m * t * (t - r) - (b - a) * (r - 1));
        q = (t - 1) * (r - 1) * (s - 1);
      }
      if (p > 0) q = -q;
      else p = -p;
      const previous = e;
      e = d;
      if (2 * p < 3 * m * q - Math.abs(tolerance * q) && p < Math.abs((previous * q) / 2)) d = p / q;
      else d = e = m;
    } else {
      d = e = m;
    }
    [a, fa] = [b, fb];
    b += Math.abs(d) > tolerance ? d : tolerance * Math.sign(m);
    fb = f(b);
  }
}
