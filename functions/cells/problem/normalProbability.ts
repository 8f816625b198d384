import { create, erfDependencies, type MathJsInstance } from 'mathjs';

/** Made on first use, so that programs which never need it start quicker. */
let library: MathJsInstance | undefined;

/** Probability that a standard normal variable lies below z; to about 1e-16 absolute. */
export function normalProbability(z: number): number {
  library ??= create(erfDependencies!);
  return 0.5 * (1 + library.erf(z / Math.SQRT2));
}
