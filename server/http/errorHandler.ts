import type { NextFunction, Request, Response } from 'express';
import { problemPage } from './pages/problemPage.ts';
import { problemDetails } from './problemDetails.ts';
import { sendPage } from './sendPage.ts';

const PROBLEM_JSON = 'application/problem+json';

/** Answers with what went wrong: to a browser as a page, to a program as JSON. */
export function errorHandler(log: (text: string) => void) {
  // Express knows a handler of errors by its four parameters.
  return (thrown: unknown, request: Request, response: Response, next: NextFunction): void => {
    if (response.headersSent) {
      next(thrown);
      return;
    }
    const problem = problemDetails(thrown);
    if (problem.status >= 500 && problem.code === 'server-fault')
      log((thrown as Error).stack ?? String(thrown));
    if (request.accepts([PROBLEM_JSON, 'html']) === 'html') {
      sendPage(response, problemPage(problem), problem.status);
    } else {
      response.status(problem.status).type(PROBLEM_JSON).send(JSON.stringify(problem));
    }
  };
}
