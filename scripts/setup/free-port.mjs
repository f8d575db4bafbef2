// @ts-check
import { createServer } from 'node:net';
import { PlainError } from './plain-error.mjs';

const TRIES = 200;

/**
 * The first port from `from` on that nothing listens on, on loopback. Somebody may still take it before the caller does:
 * callers try the next one then.
 *
 * @param {number} from
 * @returns {Promise<number>}
 */
export async function firstFreePort(from) {
  for (let port = from; port < from + TRIES && port <= 65_535; port += 1) {
    if (await isFree(port)) return port;
  }
  throw new PlainError(`No free port was found from ${from} to ${Math.min(from + TRIES - 1, 65_535)}.`);
}

/**
 * Whether this process could listen there. Only an attempt to listen is sure: a connection refused may mean a full queue.
 *
 * @param {number} port
 * @returns {Promise<boolean>}
 */
export function isFree(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen({ port, host: '127.0.0.1', exclusive: true }, () => probe.close(() => resolve(true)));
  });
}
