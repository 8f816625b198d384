/**
 * Every cell function that is shipped, in the order of the reference page.
 */
import { amountsTable } from './cells/amounts/table.ts';
import { compositionAtEquilibrium } from './cells/composition/atEquilibrium.ts';
import { compositionAtExtent } from './cells/composition/atExtent.ts';
import { compositionFractions } from './cells/composition/fractions.ts';
import { conditionsTable } from './cells/conditions/table.ts';
import { kFromGibbs } from './cells/constant/fromGibbs.ts';
import { kRestate } from './cells/constant/restate.ts';
import { kVantHoff } from './cells/constant/vantHoff.ts';
import { conversionAtEquilibrium } from './cells/conversion/atEquilibrium.ts';
import type { CellFunction } from './cells/entry.ts';
import { extentEvidence } from './cells/extent/evidence.ts';
import { extentLimitsOf } from './cells/extent/limits.ts';
import { extentSolve } from './cells/extent/solve.ts';
import { reactionAffinity } from './cells/reaction/affinity.ts';
import { reactionBalance } from './cells/reaction/balance.ts';
import { reactionCheck } from './cells/reaction/check.ts';
import { reactionDirection } from './cells/reaction/direction.ts';
import { reactionForwardProbability } from './cells/reaction/forwardProbability.ts';
import { reactionQuotientOf } from './cells/reaction/quotient.ts';
import { reactionReducedAffinity } from './cells/reaction/reducedAffinity.ts';
import { unitsConvert } from './cells/units/convert.ts';

export const catalogue: readonly CellFunction[] = [
  reactionCheck,
  reactionBalance,
  reactionQuotientOf,
  reactionDirection,
  reactionAffinity,
  reactionReducedAffinity,
  reactionForwardProbability,
  extentLimitsOf,
  extentSolve,
  extentEvidence,
  compositionAtExtent,
  compositionAtEquilibrium,
  compositionFractions,
  conversionAtEquilibrium,
  kVantHoff,
  kFromGibbs,
  kRestate,
  unitsConvert,
  amountsTable,
  conditionsTable,
];
