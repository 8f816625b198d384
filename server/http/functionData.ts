import type { CellFunction } from '../../functions/cells/entry.ts';
import { usage } from '../../functions/cells/call.ts';

/** What can be told of a cell function as plain data, for `functions --json` and for requests. */
export function functionData(entry: CellFunction) {
  const { name, summary, parameters, gives, sources = [], examples } = entry;
  return {
    name,
    summary,
    usage: `${name}(${usage(entry)})`,
    arguments: Object.entries(parameters).map(
      ([argument, { summary: meaning, isOptional, isRepeated = false }]) => ({
        name: argument,
        summary: meaning,
        isOptional,
        isRepeated,
      }),
    ),
    gives,
    sources,
    examples,
  };
}
