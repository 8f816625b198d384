/** The solver core as a library: `evenkeel/equilibrium`. */
export { solveExtent, type ExtentOutcome, type ExtentProblem } from './extent.ts';
export { quotientCurve, type CurvePoint } from './extentCurve.ts';
export { amountsAtExtent, extentLimits } from './limits.ts';
export { hasAnswer, type Outcome, type Status } from './outcome.ts';
export { direction, reactionQuotient, type Direction, type Quotient } from './quotient.ts';
