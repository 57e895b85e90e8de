import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Express } from 'express';

const SECOND = 1000;

/** Listens with limits on slow senders; rejects when the port cannot be had. */
export async function listen(app: Express, host: string, port: number): Promise<Server> {
  const server = createServer(app);
  server.headersTimeout = 15 * SECOND;
  server.requestTimeout = 300 * SECOND;
  server.keepAliveTimeout = 5 * SECOND;
  server.maxConnections = 1000;
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, resolve);
  });
  return server;
}

/** Port a server really listens on (0 lets the system choose). */
export const portOf = (server: Server): number => (server.address() as AddressInfo).port;

/** Stops taking requests, lets those under way end, and cuts what is left after the grace time. */
export async function drain(server: Server, graceSeconds: number): Promise<void> {
  const closed = new Promise<void>((resolve) => server.close(() => resolve()));
  server.closeIdleConnections();
  const cut = setTimeout(() => server.closeAllConnections(), graceSeconds * SECOND);
  await closed;
  clearTimeout(cut);
}
