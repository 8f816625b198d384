/**
 * The shape of a text workbook, from which its published JSON Schema is made.
 *
 * The message of each part is what is wanted there; it ends the sentence "... is wanted".
 */
import * as z from 'zod';
import type { Status } from '../../functions/equilibrium/outcome.ts';

const STATUSES = [
  'settled',
  'at limit',
  'exhausted',
  'blocked',
  'refused',
  'out of time',
] as const satisfies readonly Status[];

/** A double has between 15 and 17 significant digits. */
const MOST_DIGITS = 17;

const text = (meaning: string) => z.string({ error: 'a text (a number in quotes is one)' }).describe(meaning);
const number = (meaning: string) => z.number({ error: 'a number' }).describe(meaning);
const record = <Item extends z.ZodType>(item: Item, wanted: string) =>
  z.record(z.string(), item, { error: wanted });

const scalar = z.union([z.number(), z.string(), z.boolean()], { error: 'a number, a text, true or false' });

/** A share in per cent below 100, such as `0.1 %`: a wider one would let anything pass. */
export const PER_CENT = /^(\d{1,2}(?:\.\d+)?)\s*%$/;

const TOLERANCE = 'a number not below 0, or a share such as 0.1 %';
const tolerance = z.union(
  [z.number().min(0, { error: TOLERANCE }), z.string().regex(PER_CENT, { error: TOLERANCE })],
  {
    error: TOLERANCE,
  },
);

const single = z.union(
  [
    z.number(),
    z.string(),
    z.boolean(),
    z.null(),
    z.strictObject({ error: z.string() }),
    z.strictObject({ status: z.enum(STATUSES) }),
  ],
  { error: `a value, {error: CODE} or {status: WORD} with one of ${STATUSES.join(', ')}` },
);

const input = z.strictObject(
  {
    cell: text('Its cell, with the sheet: Kettle!B4.'),
    unit: text('The unit of its value.').optional(),
    min: number('Smallest value that may be set.').optional(),
    max: number('Largest value that may be set.').optional(),
    uncertainty: number('Standard uncertainty, in the same unit.').optional(),
  },
  { error: 'a set of keys such as {cell: Kettle!B4, unit: mol}' },
);

const output = z.strictObject(
  {
    cell: text('Its cell or range, with the sheet: Kettle!E3.'),
    unit: text('A label; nothing is converted.').optional(),
    digits: z
      .int({ error: 'a whole number from 1 to 17' })
      .min(1, { error: 'a whole number from 1 to 17' })
      .max(MOST_DIGITS, { error: 'a whole number from 1 to 17' })
      .describe('Significant digits to show.')
      .optional(),
  },
  { error: 'a set of keys such as {cell: Kettle!E3, digits: 5}' },
);

const check = z.strictObject(
  {
    given: record(scalar, 'inputs and their values').optional().describe('Inputs that this case changes.'),
    expect: record(
      z.union([single, z.array(z.array(single))], {
        error: `a value, rows of values, {error: CODE} or {status: WORD} with one of ${STATUSES.join(', ')}`,
      }),
      'outputs and their expected values',
    ).describe('What the outputs should show.'),
    within: z
      .union([tolerance, z.record(z.string(), tolerance)], {
        error: `${TOLERANCE}, or one of these for each output`,
      })
      .optional()
      .describe('How far a number may lie off: absolute, a share in per cent, or one for each output.'),
    source: z
      .string({ error: 'a text that says where the expected values come from' })
      .min(1, { error: 'a text that says where the expected values come from' })
      .describe('Where the expected values come from.'),
  },
  { error: 'a set of keys: given, expect, within, source' },
);

/** All but the contents of the sheets, whose reader knows better what to say. */
export const workbookFrame = z.strictObject(
  {
    workbook: z.literal(1, { error: '1' }).describe('Version of the format.'),
    title: text('What the sheet is called.'),
    about: text('What it works out, and for whom.').optional(),
    names: record(text('A range: Kettle!$A$3:$C$7.'), 'names and their ranges').optional(),
    sheets: record(
      record(z.unknown(), 'addresses and what stands there'),
      'sheets by name, each with its addresses',
    ),
    inputs: record(input, 'inputs by name').optional().describe('Cells that a case may change.'),
    outputs: record(output, 'outputs by name').optional().describe('Cells and ranges that are reported.'),
    checks: z
      .array(check, { error: 'a list of checks' })
      .optional()
      .describe("The workbook's own acceptance cases."),
  },
  { error: 'a set of keys' },
);

export type WorkbookFrame = z.infer<typeof workbookFrame>;

/** `A3` or `G4:G7`: where a block begins, or what is filled. */
export const BLOCK_ADDRESS = /^[A-Za-z]{1,3}[1-9][0-9]*(:[A-Za-z]{1,3}[1-9][0-9]*)?$/;

const value = z.union([z.number(), z.boolean(), z.string(), z.strictObject({ text: z.string() })]);
const cell = z.union([z.null(), value]);

/** The whole document. */
export const workbookDocument = workbookFrame.extend({
  sheets: z
    .record(z.string(), z.record(z.string().regex(BLOCK_ADDRESS), z.union([value, z.array(z.array(cell))])))
    .describe('A first cell with a value or rows of values, or a range with a formula that is filled down.'),
});
