/**
 * What a cell function is.
 *
 * One entry says everything about one function; its registration, argument checks, reference page,
 * command-line help and example tests are derived from it, and nothing about it is written twice.
 * An own-functions file exports entries made the same way.
 */
import type { Outcome } from '../equilibrium/outcome.ts';

/** What one cell holds; a blank cell is null. */
export type CellScalar = number | string | boolean | null;

/** A rectangle of cells, row by row; never empty. */
export type CellTable = readonly (readonly CellScalar[])[];

/** What stands at an argument's place: one value, or a rectangle. A rectangle of one cell is its value. */
export type CellValue = CellScalar | CellTable;

/** The size of a rectangle. `lies` tells how a table made by a table function lies, where that is known. */
export interface Shape {
  readonly rows: number;
  readonly columns: number;
  readonly lies?: 'down' | 'across';
}

/** One argument of a cell function: how it is described, and how it is read. */
export interface Parameter<Read> {
  /** What is to be given, in a sentence for the reference page, with the unit where there is one. */
  readonly summary: string;
  /** May be left out; `run` then receives undefined. A blank cell is not left out: it is read. */
  readonly isOptional: boolean;
  /** May be given again and again, together with its repeated neighbours; each value is read to a list of one. */
  readonly isRepeated?: boolean;
  /** Turns what the cell holds into a chemistry type, or throws an `InputError` that begins with `argument`. */
  readonly read: (given: CellValue, argument: string) => Read;
}

/** The arguments of a function by name, in the order in which they are given. */
export type Parameters = Readonly<Record<string, Parameter<unknown>>>;

/** The arguments as `run` receives them. */
export type Arguments<P extends Parameters> = {
  readonly [Name in keyof P]: P[Name] extends Parameter<infer Read> ? Read : never;
};

/** The sizes of the arguments; undefined for one left out, the first one's for a repeated one. */
export type Shapes<P extends Parameters> = { readonly [Name in keyof P]: Shape | undefined };

/** What a cell function answers. */
export interface Answer {
  readonly value: CellValue;
  /** The unit of the value where it is one for all of it; null for a pure number or a word. */
  readonly unit?: string | null;
  /** The evidence, where an equilibrium was solved. */
  readonly outcome?: Outcome;
}

/** A formula with the cells that it reads and what it gives. Every example runs in the tests. */
export interface Example {
  /** Blocks of cells by their top left corner, for example `{ A1: [['species', 'amount']] }`. */
  readonly cells?: Readonly<Record<string, CellTable>>;
  /** The formula as a person types it, equals sign included. */
  readonly formula: string;
  /** The value, the rectangle, or the code of the error that it gives. */
  readonly gives: CellValue | { readonly error: string };
  /** Relative difference allowed of each number; left out, the value is exact. */
  readonly within?: number;
  /** Where the expected value comes from. */
  readonly source: string;
}

export interface CellFunction<P extends Parameters = Parameters> {
  /** Upper-case words joined by dots, family first: `EXTENT.SOLVE`. */
  readonly name: string;
  /** One sentence. */
  readonly summary: string;
  readonly parameters: P;
  /** What is answered, in a phrase, with its unit. */
  readonly gives: string;
  /** The size of the answer from the number and the sizes of the arguments alone; left out, one cell. */
  shape?(given: Shapes<P>, count: number): Shape;
  /** Standards, books and papers that it follows. */
  readonly sources?: readonly string[];
  readonly examples: readonly Example[];
  run(given: Arguments<P>): Answer;
}

/**
 * The entry itself, with the types of `run` taken from its parameters.
 *
 * `defineFunction({ name: 'SAMPLE.DOUBLE', parameters: { value: number('any number') }, ... })`
 */
export function defineFunction<const P extends Parameters>(entry: CellFunction<P>): CellFunction<P> {
  return entry;
}
