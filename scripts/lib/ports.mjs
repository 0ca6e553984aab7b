// @ts-check
import net from 'node:net';
import { Failure } from './failure.mjs';

/**
 * @param {number} port 0 picks a free one
 * @param {string} host
 * @returns {Promise<number>} the port, free again
 */
function tryPort(port, host) {
  return new Promise((resolve, reject) => {
    const server = net.createServer();
    server.once('error', reject);
    server.listen({ port, host, exclusive: true }, () => {
      const address = server.address();
      server.close(() => resolve(typeof address === 'object' && address ? address.port : port));
    });
  });
}

/** A port on loopback that nobody listens on now. */
export const findFreePort = () => tryPort(0, '127.0.0.1');

/**
 * @param {number} port
 * @param {string} host
 * @throws {Failure} when the port cannot be listened on
 */
export async function assertPortFree(port, host) {
  try {
    await tryPort(port, host);
  } catch (error) {
    const code = /** @type {NodeJS.ErrnoException} */ (error).code;
    if (code === 'EADDRINUSE')
      throw new Failure(
        `Port ${port} is in use by another program: stop that one, or choose another port, like PORT=${port + 10} npm start.`,
      );
    if (code === 'EACCES')
      throw new Failure(
        `This user may not open port ${port}: choose one above 1023, like PORT=4173 npm start.`,
      );
    throw error;
  }
}

/**
 * @param {string} host
 * @param {number} port
 * @param {number} timeoutMs
 * @returns {Promise<string | null>} null when something answers, else why not
 */
export function findConnectFault(host, port, timeoutMs) {
  return new Promise((resolve) => {
    const socket = net.connect({ host, port });
    /** @param {string | null} fault */
    const finish = (fault) => {
      socket.destroy();
      resolve(fault);
    };
    socket.setTimeout(timeoutMs, () => finish('no answer in time'));
    socket.once('connect', () => finish(null));
    socket.once('error', (error) =>
      finish(
        /** @type {NodeJS.ErrnoException} */ (error).code === 'ENOTFOUND'
          ? 'no machine of that name'
          : 'nothing listens there',
      ),
    );
  });
}
