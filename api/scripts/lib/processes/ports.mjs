import { createServer } from 'node:net';
import { PlainError } from '../say.mjs';

/**
 * @param {number} port 0 for any
 * @param {string} host
 * @returns {Promise<import('node:net').Server | null>} null when somebody else has it
 */
function listen(port, host) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(null));
    server.listen(port, host, () => resolve(server));
  });
}

/** @param {import('node:net').Server} server */
const close = (server) => new Promise((resolve) => server.close(resolve));

/**
 * Better said at once than found out by the API at the end of a first start.
 * @param {{ port: number, host: string }} address
 */
export async function refuseTaken({ port, host }) {
  const server = await listen(port, host);
  if (server) return close(server);
  throw new PlainError(
    `Port ${port} is taken by another program. Choose another one, for example: PORT=${port + 10} npm start`,
  );
}

/**
 * Free ports, all different: each is held until the last one is found.
 * @param {number} count
 * @param {number[]} [preferred] taken first where free, so that an address somebody has open in a tab stays the same
 * @returns {Promise<number[]>}
 */
export async function freePorts(count, preferred = []) {
  const servers = [];
  for (let index = 0; index < count; index += 1) {
    const server =
      (preferred[index] && (await listen(preferred[index], '127.0.0.1'))) || (await listen(0, '127.0.0.1'));
    if (!server) throw new Error('There is no free port on 127.0.0.1.');
    servers.push(server);
  }
  const ports = servers.map(
    (server) => /** @type {import('node:net').AddressInfo} */ (server.address()).port,
  );
  await Promise.all(servers.map(close));
  return ports;
}
