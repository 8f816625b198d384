/** The body of a request for an evaluation. */
import express, { type RequestHandler } from 'express';
import * as z from 'zod';
import type { Given } from '../engine/host.ts';
import { serverError } from '../problems.ts';

/** Room for thousands of inputs. */
export const MAX_BODY_BYTES = 65_536;

export const BODY_EXAMPLE = '{"workbook": "kettle", "inputs": {"acid": 1.5}}';

const evaluationRequest = z.strictObject(
  {
    workbook: z.string({ error: 'it is the name of a workbook, a text' }),
    // Not a z.record: that drops the name __proto__, and no name may be passed over in silence.
    inputs: z.custom<Given>(areInputs, 'its values are numbers, texts, true or false').default({}),
  },
  {
    error: (issue) =>
      issue.code === 'unrecognized_keys'
        ? `it has ${issue.keys.join(', ')}, and takes only workbook and inputs`
        : 'it is an object with the name of a workbook',
  },
);

type EvaluationRequest = z.infer<typeof evaluationRequest>;

/**
 * Reads JSON and nothing else: a form of another site can send any other kind without asking first.
 *
 * Errors: `body-kind`, and those that express gives to the handler of errors.
 */
export const jsonBody: RequestHandler[] = [
  (request, _response, next) => {
    if (request.is('application/json') !== 'application/json') {
      throw serverError('body-kind', { given: request.get('content-type') ?? 'of no stated kind' });
    }
    next();
  },
  express.json({ limit: MAX_BODY_BYTES, type: 'application/json' }),
];

/** Errors: `body-shape`. */
export function readEvaluationRequest(body: unknown): EvaluationRequest {
  const read = evaluationRequest.safeParse(body);
  if (read.success) return read.data;
  const [issue] = read.error.issues;
  throw serverError('body-shape', {
    where: issue!.path.length === 0 ? 'the body' : issue!.path.join('.'),
    problem: issue!.message,
    example: BODY_EXAMPLE,
  });
}

function areInputs(value: unknown): boolean {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return false;
  return Object.values(value).every((each) => ['number', 'string', 'boolean'].includes(typeof each));
}
