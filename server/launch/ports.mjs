import { once } from 'node:events';
import { createServer } from 'node:net';

/**
 * Listens once and lets go again.
 * @param {string} host @param {number} port 0 for any that is free
 * @returns {Promise<number>} the port @throws NodeJS.ErrnoException EADDRINUSE, EACCES, with its port
 */
export async function tryPort(host, port) {
  const server = createServer();
  server.listen({ host, port, exclusive: true });
  await once(server, 'listening');
  const address = server.address();
  server.close();
  await once(server, 'close');
  return typeof address === 'object' && address ? address.port : port;
}

/** @returns {Promise<number>} a port of loopback that was free a moment ago */
export function freePort() {
  return tryPort('127.0.0.1', 0);
}
