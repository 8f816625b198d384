import express, { type Express } from 'express';
import helmet from 'helmet';
import { api } from './api.ts';
import { errorHandler } from './errorHandler.ts';
import { loopbackOnly } from './loopbackOnly.ts';
import { pages } from './pages.ts';
import { refuseUnknownPage } from './refuse.ts';
import type { Serving } from './serving.ts';

/** The server without its socket. `log` is given what a fault of the server itself says. */
export function createApp(serving: Serving, log: (text: string) => void): Express {
  return express()
    .set('query parser', 'simple')
    .disable('x-powered-by')
    .disable('etag')
    .use(SECURITY_HEADERS)
    .use(loopbackOnly)
    .use(pages(serving))
    .use('/v1', api(serving))
    .use(refuseUnknownPage)
    .use(errorHandler(log));
}

/** A page states its own policy in place of this one. */
const SECURITY_HEADERS = helmet({
  contentSecurityPolicy: {
    useDefaults: false,
    directives: {
      defaultSrc: ["'none'"],
      baseUri: ["'none'"],
      formAction: ["'none'"],
      frameAncestors: ["'none'"],
    },
  },
  // The address is plain HTTP on this computer.
  strictTransportSecurity: false,
});
