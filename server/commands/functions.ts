import { catalogue } from '../../functions/catalogue.ts';
import type { CellFunction } from '../../functions/cells/entry.ts';
import { functionData } from '../http/functionData.ts';
import { suggestion } from '../nearest.ts';
import { loadOwnFunctions } from '../ownFunctions.ts';
import { serverError } from '../problems.ts';
import { ExitCode } from './exitCode.ts';
import { functionList, functionText } from './functionText.ts';
import type { Surroundings } from './surroundings.ts';

export interface FunctionsOptions {
  readonly json?: boolean;
  readonly functions?: string;
}

const INDENT = 2;

/** `evenkeel functions`: lists the cell functions, or describes the one that is named. */
export async function functions(
  name: string | undefined,
  { json = false, functions: file }: FunctionsOptions,
  { stdout }: Surroundings,
): Promise<number> {
  const own = file === undefined ? [] : (await loadOwnFunctions(file)).functions;
  const entries = asked([...catalogue, ...own], name?.toUpperCase());
  const [only, ...others] = entries;
  if (json) stdout.write(`${JSON.stringify(entries.map(functionData), null, INDENT)}\n`);
  else if (name !== undefined && only !== undefined && others.length === 0) stdout.write(functionText(only));
  else stdout.write(functionList(entries));
  return ExitCode.good;
}

/** All, the one with the name, or the family. */
function asked(entries: readonly CellFunction[], name: string | undefined): readonly CellFunction[] {
  if (name === undefined) return entries;
  const found = entries.filter((entry) => entry.name === name || entry.name.startsWith(`${name}.`));
  if (found.length > 0) return found;
  throw serverError('function-unknown', {
    name,
    nearest: suggestion(
      name,
      entries.map((entry) => entry.name),
    ),
  });
}
