/** Errors as answers to requests, after RFC 9457 (Problem Details for HTTP APIs). */
import { STATUS_CODES } from 'node:http';
import type { InputError } from '../../functions/errors.ts';
import { isInputError } from '../../functions/errors.ts';
import { answerTo, serverError } from '../problems.ts';
import { BODY_EXAMPLE, MAX_BODY_BYTES } from './body.ts';

export interface ProblemDetails {
  /** The title is the status in words, and `code` says which of our errors it is. */
  readonly type: 'about:blank';
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly code: string;
}

export function problemDetails(thrown: unknown): ProblemDetails {
  const error = isInputError(thrown) ? thrown : errorOfExpress(thrown);
  if (error === null) {
    const detail = 'The request could not be answered; the server has written why.';
    return details(500, 'server-fault', detail);
  }
  return details(answerTo(error.code).http, error.code, error.message);
}

function details(status: number, code: string, detail: string): ProblemDetails {
  return { type: 'about:blank', title: STATUS_CODES[status] ?? '', status, detail, code };
}

/** What express and its reader of bodies refuse by themselves; null for a fault of the server's. */
function errorOfExpress(thrown: unknown): InputError | null {
  const { status, type, message } = thrown as { status?: number; type?: string; message: string };
  if (type === 'entity.too.large') return serverError('body-too-large', { limit: MAX_BODY_BYTES });
  if (type === 'entity.parse.failed') {
    return serverError('body-unreadable', { reason: message, example: BODY_EXAMPLE });
  }
  if (status === 415) return serverError('body-kind', { given: message });
  if (status === undefined || status >= 500) return null;
  return serverError('request-unreadable', { reason: message });
}
