/**
 * What our cell functions answered during an evaluation, kept beside the engine.
 *
 * The engine holds values only, and its errors have no code; evidence, units and codes are kept
 * here by cell and by the place of the call in the cell's formula.
 */
import type { Answer } from '../../functions/cells/entry.ts';
import type { InputError } from '../../functions/errors.ts';
import type { CallRecorder, CellPlace } from '../../functions/plugin.ts';
import type { FunctionAnswer } from '../evaluation.ts';

type Call = { readonly name: string; readonly answer: Answer } | { readonly error: InputError };

export class Session implements CallRecorder {
  readonly isCallRecorder = true;
  readonly #instant: string;
  readonly #calls = new Map<string, Map<object, Call>>();
  #isInstantRead = false;

  /** `instant` is what NOW and TODAY stand for, in ISO 8601. */
  constructor(instant: string) {
    this.#instant = instant;
  }

  /** The instant, noting that a formula asked for it. */
  readInstant(): string {
    this.#isInstantRead = true;
    return this.#instant;
  }

  /** The instant where a formula asked for it, otherwise null. */
  get instantRead(): string | null {
    return this.#isInstantRead ? this.#instant : null;
  }

  answered(cell: CellPlace, call: object, name: string, answer: Answer): void {
    this.#record(cell, call, { name, answer });
  }

  failed(cell: CellPlace, call: object, error: InputError): void {
    this.#record(cell, call, { error });
  }

  passedOn(cell: CellPlace, call: object): void {
    this.#calls.get(keyOf(cell))?.delete(call);
  }

  /** The calls in a cell that gave an answer, in the order in which they were first worked. */
  answersAt(cell: CellPlace): FunctionAnswer[] {
    const answers: FunctionAnswer[] = [];
    for (const call of this.#calls.get(keyOf(cell))?.values() ?? []) {
      if ('error' in call) continue;
      const { unit, outcome } = call.answer;
      answers.push({ function: call.name, unit: unit ?? null, outcome: outcome ?? null });
    }
    return answers;
  }

  /** The error of our own with this message that a call in the cell gave, if any. */
  errorAt(cell: CellPlace, message: string): InputError | undefined {
    for (const call of this.#calls.get(keyOf(cell))?.values() ?? []) {
      if ('error' in call && call.error.message === message) return call.error;
    }
    return undefined;
  }

  #record(cell: CellPlace, node: object, call: Call): void {
    const key = keyOf(cell);
    const calls = this.#calls.get(key);
    if (calls === undefined) this.#calls.set(key, new Map([[node, call]]));
    else calls.set(node, call);
  }
}

function keyOf({ sheet, row, col }: CellPlace): string {
  return `${sheet}:${row}:${col}`;
}
