/**
 * What computes an evaluation.
 */
import { createRequire } from 'node:module';
import { HyperFormula } from 'hyperformula';
import type { Versions } from '../evaluation.ts';
import type { OwnFunctions } from './ownFunctions.ts';

/** Resolved from the sources and from the built package alike: both lie one folder deep in the project. */
const { version } = createRequire(import.meta.url)('evenkeel/package.json') as { version: string };

export function versions(ownFunctions: OwnFunctions | null): Versions {
  return {
    evenkeel: version,
    hyperformula: HyperFormula.version,
    node: process.versions.node,
    ownFunctions: ownFunctions && { file: ownFunctions.file, sha256: ownFunctions.sha256 },
  };
}
