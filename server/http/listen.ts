import { once } from 'node:events';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Express } from 'express';
import { systemReason } from '../files/reasons.ts';
import { serverError } from '../problems.ts';

const LOOPBACK = '127.0.0.1';
/** Requests in work may end; then the connections are cut. */
const PATIENCE_MS = 2000;

/** Listens on this computer only. Errors: `port-unusable`. */
export async function listen(app: Express, port: number): Promise<Server> {
  const server = createServer(app).listen(port, LOOPBACK);
  try {
    await once(server, 'listening');
  } catch (thrown) {
    throw serverError('port-unusable', { port, reason: systemReason(thrown) });
  }
  return server;
}

export function addressOf(server: Server): string {
  return `http://${LOOPBACK}:${(server.address() as AddressInfo).port}/`;
}

export async function close(server: Server): Promise<void> {
  const closed = once(server, 'close');
  server.close();
  const cut = setTimeout(() => server.closeAllConnections(), PATIENCE_MS);
  await closed;
  clearTimeout(cut);
}
