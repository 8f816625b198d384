/** The sample workbooks, read and evaluated once for all tests of a file. */
import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { evaluateWorkbook } from '../../server/engine/evaluateWorkbook.ts';
import { Host, type Given } from '../../server/engine/host.ts';
import type { Evaluation, OutputValue, Value } from '../../server/evaluation.ts';
import type { Workbook } from '../../server/workbook/model.ts';
import { readYamlWorkbook } from '../../server/workbook/yaml.ts';

const FOLDER = fileURLToPath(new URL('../../workbook-samples/', import.meta.url));
const INSTANT = '2026-01-01T00:00:00Z';

export const sampleFiles: readonly string[] = readdirSync(FOLDER).filter((name) => name.endsWith('.yaml'));

export function sample(file: string): Workbook {
  return readYamlWorkbook(readFileSync(FOLDER + file), file);
}

export function evaluated(file: string): Evaluation {
  return evaluateWorkbook(sample(file), { instant: INSTANT });
}

/** A sample standing in an engine, to be run for many inputs. */
export class RunningSample {
  readonly #host: Host;
  constructor(file: string) {
    this.#host = new Host(sample(file), { instant: INSTANT });
  }

  /** The one number that an output gives for these inputs; the others keep what they had. */
  number(output: string, given: Given = {}): number {
    const { value } = this.#host.run(given)[output]!;
    if (typeof value !== 'number') throw new Error(`${output} is ${JSON.stringify(value)}`);
    return value;
  }

  /** The numbers in a column of cells. */
  column(address: string): number[] {
    return (this.#host.values(address) as Value[][]).map(([value]) => value as number);
  }
}

/** Every value of an output, a range's row by row. */
export function valuesOf({ value }: OutputValue): Value[] {
  return Array.isArray(value) ? (value as Value[][]).flat() : [value as Value];
}
