/**
 * What the solver hands to Math.log and Math.exp, recorded by a second build of the same source in
 * which both names stand for a recorder. The solver that is timed knows nothing of it.
 */
import { build } from 'esbuild';
import type { ExtentProblem, solveExtent } from '../../../functions/equilibrium/index.ts';
import { root } from '../../root.mjs';

interface Recorder {
  log: (x: number) => number;
  exp: (x: number) => number;
}

interface Build {
  readonly solveExtent: typeof solveExtent;
  readonly recorder: Recorder;
}

export async function recordedArguments(problems: readonly ExtentProblem[]) {
  const { outputFiles } = await build({
    entryPoints: [`${root}/functions/equilibrium/index.ts`],
    bundle: true,
    format: 'esm',
    write: false,
    define: { 'Math.log': 'recorder.log', 'Math.exp': 'recorder.exp' },
    banner: { js: 'export const recorder = { log: Math.log, exp: Math.exp };' },
  });
  const source = Buffer.from(outputFiles[0]!.contents).toString('base64');
  const instrumented = (await import(`data:text/javascript;base64,${source}`)) as Build;

  const logarithms: number[] = [];
  const exponentials: number[] = [];
  instrumented.recorder.log = (x) => {
    logarithms.push(x);
    return Math.log(x);
  };
  instrumented.recorder.exp = (x) => {
    exponentials.push(x);
    return Math.exp(x);
  };
  for (const problem of problems) instrumented.solveExtent(problem);
  return { logarithms: Float64Array.from(logarithms), exponentials: Float64Array.from(exponentials) };
}
