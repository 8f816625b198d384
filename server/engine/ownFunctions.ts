import type { CellFunction } from '../../functions/cells/entry.ts';

/** A file of the analyst's own functions. */
export interface OwnFunctions {
  /** As the person named it. */
  readonly file: string;
  /** Digest of the file's bytes; what the file imports has its own. */
  readonly sha256: string;
  readonly functions: readonly CellFunction[];
}
