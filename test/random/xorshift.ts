/**
 * Seeded random numbers for tests: xorshift128, period 2^128 - 1.
 *
 * Source: Marsaglia, Xorshift RNGs, Journal of Statistical Software 8 (2003) 14.
 */
export interface Random {
  /** Uniform in [0, 1), 53 bits. */
  number(): number;
  /** A whole number from `lowest` to `highest`. */
  whole(lowest: number, highest: number): number;
  /** True with this probability. */
  chance(probability: number): boolean;
  /** Uniform between two numbers. */
  between(lowest: number, highest: number): number;
}

/** The first numbers of similar seeds are alike, so they are thrown away. */
const WARM_UP = 32;

export function seededRandom(seed: number): Random {
  let [x, y, z, w] = [seed | 0, 362436069, 521288629, 88675123];
  const next = () => {
    const t = x ^ (x << 11);
    [x, y, z] = [y, z, w];
    w = w ^ (w >>> 19) ^ t ^ (t >>> 8);
    return w >>> 0;
  };
  const number = () => ((next() >>> 5) * 2 ** 26 + (next() >>> 6)) / 2 ** 53;
  for (let i = 0; i < WARM_UP; i++) next();
  return {
    number,
    whole: (lowest, highest) => lowest + Math.floor(number() * (highest - lowest + 1)),
    chance: (probability) => number() < probability,
    between: (lowest, highest) => lowest + number() * (highest - lowest),
  };
}
