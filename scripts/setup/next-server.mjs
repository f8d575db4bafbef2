// @ts-check
import { closeSync, openSync, readFileSync, rmSync } from 'node:fs';
import { setTimeout as wait } from 'node:timers/promises';
import { spawnTied, stopGroup } from './child-process.mjs';
import { firstFreePort } from './free-port.mjs';
import { nextProgram } from './next-build.mjs';
import { PlainError } from './plain-error.mjs';

const PORT_TRIES = 5;
const PATIENCE = 120_000;

/**
 * @typedef {object} ServeRequest
 * @property {'start' | 'dev'} mode
 * @property {number} firstPort
 * @property {string | null} log a file for what it prints; null: the terminal
 * @property {(address: string) => NodeJS.ProcessEnv} envFor
 * @property {import('./shutdown.mjs').Shutdown} shutdown
 */
/** @typedef {{ address: string, ended: Promise<number>, stop: () => Promise<void> }} NextServer */

/**
 * Serves the app on the first free port of loopback and waits until it says that it is ready, its database included.
 *
 * @param {string} root
 * @param {ServeRequest} request
 * @returns {Promise<NextServer>}
 */
export async function serveNext(root, request) {
  let from = request.firstPort;
  for (let attempt = 0; attempt < PORT_TRIES; attempt += 1) {
    const port = await firstFreePort(from);
    const server = await tryPort(root, request, port);
    if (server !== null) return server;
    from = port + 1;
  }
  throw new PlainError(`The app does not start${request.log ? `; see ${request.log}` : ''}.`);
}

/**
 * @param {string} root
 * @param {ServeRequest} request
 * @param {number} port
 * @returns {Promise<NextServer | null>} null when the port was taken in the meantime
 */
async function tryPort(root, { mode, log, envFor, shutdown }, port) {
  const address = `http://127.0.0.1:${port}`;
  if (log) rmSync(log, { force: true });
  const logFile = log ? openSync(log, 'w') : null;
  const child = spawnTied(
    process.execPath,
    [nextProgram(root), mode, '--hostname', '127.0.0.1', '--port', String(port)],
    {
      cwd: root,
      env: envFor(address),
      stdio: ['ignore', logFile ?? 'inherit', logFile ?? 'inherit'],
      ownGroup: true,
    },
  );
  if (logFile !== null) closeSync(logFile);
  const stop = () => stopGroup(child, 'SIGTERM', 10_000);
  const forget = shutdown.onStop(stop);
  /** @type {Promise<number>} */
  const ended = new Promise((resolve) => {
    child.once('error', () => resolve(127));
    child.once('exit', (code) => resolve(code ?? 128));
  });

  if (await becomesReady(address, ended)) return { address, ended, stop };
  forget();
  await stop();
  const said = log ? readFileSync(log, 'utf8') : '';
  if (said.includes('EADDRINUSE')) return null;
  throw new PlainError(`The app does not get ready at ${address}.${said ? ` It said:\n${said.trim()}` : ''}`);
}

/**
 * @param {string} address
 * @param {Promise<number>} ended
 * @returns {Promise<boolean>} false when the server ended, or was not ready before our patience was over
 */
async function becomesReady(address, ended) {
  let alive = true;
  void ended.then(() => (alive = false));
  const deadline = Date.now() + PATIENCE;
  while (alive && Date.now() < deadline) {
    if (await isReady(address)) return alive;
    await Promise.race([wait(200), ended]);
  }
  return false;
}

/** @param {string} address */
async function isReady(address) {
  try {
    const response = await fetch(`${address}/api/readyz`, { signal: AbortSignal.timeout(30_000) });
    await response.body?.cancel();
    return response.ok;
  } catch {
    return false;
  }
}
