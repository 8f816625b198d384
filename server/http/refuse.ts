/** Handlers for what the server does not have. */
import type { RequestHandler } from 'express';
import { serverError } from '../problems.ts';

/** Errors: `method-unknown`. */
export function refuseOtherMethods(allowed: string): RequestHandler {
  return ({ method, baseUrl, path }, response) => {
    response.set('Allow', allowed);
    throw serverError('method-unknown', { method, path: `${baseUrl}${path}`, allowed });
  };
}

/** Errors: `page-unknown`. */
export const refuseUnknownPage: RequestHandler = ({ path }) => {
  throw serverError('page-unknown', { path });
};
