/**
 * A call of a cell function, without the engine: argument names, arity, reading, shapes.
 *
 * The plugin evaluates the arguments and hands them here.
 */
import { inputError } from '../errors.ts';
import type { Answer, CellFunction, CellValue, Parameter, Shape } from './entry.ts';

/** What a call needs to know of a function, worked out once. */
interface Signature {
  readonly names: readonly string[];
  readonly parameters: readonly Parameter<unknown>[];
  /** How many arguments there must be. */
  readonly required: number;
  /** How many of the last parameters may be given again and again, together. */
  readonly repeats: number;
}

const signatures = new WeakMap<CellFunction, Signature>();

function signatureOf(entry: CellFunction): Signature {
  let signature = signatures.get(entry);
  if (signature === undefined) {
    const parameters = Object.values<Parameter<unknown>>(entry.parameters);
    signature = {
      names: Object.keys(entry.parameters),
      parameters,
      required: parameters.filter(({ isOptional }) => !isOptional).length,
      repeats: parameters.filter(({ isRepeated }) => isRepeated).length,
    };
    signatures.set(entry, signature);
  }
  return signature;
}

/** The parameters as a person reads them: `equation, K, amounts, [conditions]`. */
export function usage(entry: CellFunction): string {
  const { names, parameters, repeats } = signatureOf(entry);
  const words = names.map((name, i) => (parameters[i]!.isOptional ? `[${name}]` : name));
  return repeats === 0 ? words.join(', ') : `${words.join(', ')}, ...`;
}

/**
 * Works the function on values; `undefined` stands for an argument left out.
 *
 * Throws an `InputError` when the number of arguments, or one of them, does not fit.
 */
export function callFunction(entry: CellFunction, values: readonly (CellValue | undefined)[]): Answer {
  const signature = signatureOf(entry);
  const { names, parameters, repeats } = signature;
  checkCount(entry, signature, values.length);
  const given: Record<string, unknown> = {};
  for (let i = 0; i < names.length - repeats; i++) {
    const value = values[i];
    if (value === undefined && parameters[i]!.isOptional) continue;
    given[names[i]!] = parameters[i]!.read(value ?? null, names[i]!);
  }
  if (repeats > 0) readRepeated(given, signature, values);
  return entry.run(given);
}

/** Reads the repeated arguments turn by turn; each parameter collects a list. */
function readRepeated(
  given: Record<string, unknown>,
  { names, parameters, repeats }: Signature,
  values: readonly (CellValue | undefined)[],
): void {
  const first = names.length - repeats;
  for (let i = first; i < names.length; i++) {
    const list: unknown[] = [];
    for (let turn = 1, at = i; at < values.length; turn++, at += repeats) {
      list.push(...(parameters[i]!.read(values[at] ?? null, `${names[i]!} ${turn}`) as unknown[]));
    }
    given[names[i]!] = list;
  }
}

/** The size of the answer to arguments of these sizes; arguments that do not fit give one cell, the error's. */
export function answerShape(entry: CellFunction, shapes: readonly (Shape | undefined)[]): Shape {
  if (entry.shape === undefined) return ONE_CELL;
  const { names, parameters } = signatureOf(entry);
  const given = Object.fromEntries(names.map((name, position) => [name, shapes[position]]));
  const isComplete = names.every((name, i) => parameters[i]!.isOptional || given[name] !== undefined);
  return isComplete ? entry.shape(given, shapes.length) : ONE_CELL;
}

const ONE_CELL: Shape = { rows: 1, columns: 1 };

function checkCount(entry: CellFunction, { names, required, repeats }: Signature, count: number): void {
  const isWhole = repeats === 0 ? count <= names.length : (count - names.length) % repeats === 0;
  if (count >= required && isWhole) return;
  const takes =
    repeats > 0 ? `${names.length}, or ${repeats} more again and again` : range(required, names.length);
  throw inputError('argument-count', { given: count, takes, usage: usage(entry) });
}

function range(lowest: number, highest: number): string {
  return lowest === highest ? `${lowest}` : `${lowest} to ${highest}`;
}
