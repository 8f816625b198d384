/** Doubles as whole numbers times a power of two, without loss. */

export interface Exact {
  /** The number is `mantissa` times 2^`exponent`. */
  readonly mantissa: bigint;
  readonly exponent: number;
}

/** All the numbers on one exponent, the lowest that any of them needs. */
export function exactDoubles(numbers: readonly number[]): { mantissas: bigint[]; exponent: number } {
  const parts = numbers.map(exact);
  const exponent = Math.min(...parts.map((part) => part.exponent));
  return { mantissas: parts.map((part) => part.mantissa << BigInt(part.exponent - exponent)), exponent };
}

/** Read off the 64 bits: a sign, 11 of exponent, 52 of fraction. */
function exact(x: number): Exact {
  if (!Number.isFinite(x)) throw new Error(`invariant: ${x} is no number`);
  const view = new DataView(new ArrayBuffer(8));
  view.setFloat64(0, x);
  const bits = view.getBigUint64(0);
  const biased = Number((bits >> 52n) & 0x7ffn);
  const fraction = bits & 0xfffffffffffffn;
  const size = biased === 0 ? fraction : fraction | (1n << 52n);
  return { mantissa: x < 0 ? -size : size, exponent: Math.max(biased, 1) - 1075 };
}
