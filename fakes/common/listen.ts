import { createServer, type RequestListener, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';

/** The stand-ins are reachable from this machine only. */
export const LOOPBACK = '127.0.0.1';

export function listen(listener: RequestListener, port: number): Promise<Server> {
  const server = createServer(listener);
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, LOOPBACK, () => resolve(server));
  });
}

export function portOf(server: { address(): string | AddressInfo | null }): number {
  const address = server.address();
  if (address === null || typeof address === 'string')
    throw new Error('the server is not listening on a port');
  return address.port;
}

export function closeServer(server: Server): Promise<void> {
  return new Promise((resolve) => {
    server.close(() => resolve());
    server.closeAllConnections();
  });
}
