import type { NextFunction, Request, Response } from 'express';
import { serverError } from '../problems.ts';

const LOOPBACK_HOSTS = ['127.0.0.1', 'localhost', '[::1]'];
/** A client leaves this port out of the address. */
const HTTP_PORT = 80;

/**
 * Lets nobody in but the person at this computer.
 *
 * Any page that the person has open elsewhere can send requests here too, and a name that leads to
 * 127.0.0.1 can be rented. So the request must be addressed to this server by a loopback name, must not
 * have been made by another page, and may come across sites only as a followed link.
 *
 * Errors: `host-foreign`, `origin-foreign`.
 */
export function loopbackOnly(request: Request, _response: Response, next: NextFunction): void {
  const { host = '(nobody)', origin } = request.headers;
  const port = request.socket.localPort;
  const addresses = LOOPBACK_HOSTS.map((name) => (port === HTTP_PORT ? name : `${name}:${port}`));
  if (!addresses.includes(host.toLowerCase())) {
    throw serverError('host-foreign', { host, address: `http://${addresses[0]}/` });
  }
  const isOwnPage = origin === undefined || addresses.some((address) => origin === `http://${address}`);
  if (!isOwnPage) throw serverError('origin-foreign', { origin });
  if (isFromOtherSite(request)) throw serverError('origin-foreign', { origin: 'another site' });
  next();
}

/** By the headers that browsers add and no page can change (Fetch Metadata Request Headers, W3C). */
function isFromOtherSite({ method, headers }: Request): boolean {
  const isFollowedLink = method === 'GET' && headers['sec-fetch-mode'] === 'navigate';
  return headers['sec-fetch-site'] === 'cross-site' && !isFollowedLink;
}
