/**
 * How a host hears of the calls of our functions.
 */
import type { Answer } from '../cells/entry.ts';
import type { InputError } from '../errors.ts';

/** The address of a cell as the engine counts it, from 0. */
export interface CellPlace {
  readonly sheet: number;
  readonly row: number;
  readonly col: number;
}

/**
 * Hears of every call. A host that wants the evidence passes one as the engine's `context` option;
 * `call` is the same object for the same place in the same formula.
 */
export interface CallRecorder {
  readonly isCallRecorder: true;
  answered(cell: CellPlace, call: object, functionName: string, answer: Answer): void;
  failed(cell: CellPlace, call: object, error: InputError): void;
  /** An argument is an error already, which goes on as it is; the call was not worked. */
  passedOn(cell: CellPlace, call: object): void;
}

/** The recorder that an engine was given as its context, if it was. */
export function recorderOf(context: unknown): CallRecorder | undefined {
  const recorder = context as CallRecorder | undefined;
  return recorder?.isCallRecorder === true ? recorder : undefined;
}
