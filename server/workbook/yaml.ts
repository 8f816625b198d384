import { createHash } from 'node:crypto';
import { serverError } from '../problems.ts';
import { ProblemList, type Report, offsetOf, unusableFile } from './fileProblems.ts';
import type { Workbook } from './model.ts';
import { readChecks } from './readChecks.ts';
import { readFrame } from './readFrame.ts';
import { readInputs, readOutputs } from './readInputs.ts';
import { readNames } from './readReferences.ts';
import { readSheets } from './readSheets.ts';
import { parseYaml } from './yamlSyntax.ts';
import { isPlainMap, plainValue } from './yamlValues.ts';

/** One MiB: some 30,000 typed cells, and a few seconds for the slowest text of that length. */
export const MAX_WORKBOOK_BYTES = 1_048_576;

/**
 * Reads a text workbook.
 *
 * @param bytes the file as it lies on the disk
 * @param file its name for messages
 * @throws UnusableWorkbook with every problem found and its line and column
 *
 * ## Method
 * 1. Bytes to text, text to YAML nodes, nodes to plain values.
 * 2. The frame is held against the schema, the sheets are laid out from their blocks.
 * 3. Names, inputs, outputs and checks are held against the sheets.
 *
 * Each step reports all that it finds before the reading ends.
 */
export function readYamlWorkbook(bytes: Uint8Array, file: string): Workbook {
  const { root, lines } = parseYaml(decode(bytes, file), file);
  const problems = new ProblemList(file, lines);
  const report: Report = (error, path, part) => problems.add(error, () => offsetOf(root, path, part));

  const document = plainValue(root, (error, offset) => problems.add(error, () => offset));
  const frame = readFrame(document, report);
  const sheets = isPlainMap(document) ? readSheets(document.sheets, report) : [];
  problems.throwIfAny();
  if (frame === null) throw new Error('invariant: what is wrong with the frame was reported');

  const taken = new Map<string, string>();
  const inputs = readInputs(frame.inputs ?? {}, sheets, taken, report);
  const outputs = readOutputs(frame.outputs ?? {}, sheets, taken, report);
  const workbook: Workbook = {
    title: frame.title,
    about: frame.about ?? '',
    file,
    sha256: createHash('sha256').update(bytes).digest('hex'),
    names: readNames(frame.names ?? {}, sheets, report),
    sheets,
    inputs,
    outputs,
    checks: readChecks(frame.checks ?? [], inputs, outputs, report),
    arrayArithmetic: true,
  };
  problems.throwIfAny();
  return workbook;
}

function decode(bytes: Uint8Array, file: string): string {
  if (bytes.length > MAX_WORKBOOK_BYTES) {
    const details = { size: bytes.length, limit: MAX_WORKBOOK_BYTES };
    throw unusableFile(file, serverError('workbook-too-large', details));
  }
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    throw unusableFile(file, serverError('workbook-not-utf8', {}));
  }
}
