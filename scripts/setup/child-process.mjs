// @ts-check
import { spawn, spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { PlainError } from './plain-error.mjs';

/** @typedef {{ uid: number, gid: number }} Identity */
/**
 * @typedef {object} ChildOptions
 * @property {string} [cwd]
 * @property {NodeJS.ProcessEnv} [env] the whole environment; default: our own
 * @property {Identity | null} [as] another user to run as; only root can
 * @property {import('node:child_process').StdioOptions} [stdio]
 * @property {boolean} [ownGroup] keep the terminal's Ctrl-C away, for children that are stopped in order by us
 * @property {'TERM' | 'INT' | 'KILL'} [whenWeDie] the signal it gets should we be killed without a chance to stop it
 */

const SETPRIV = '/usr/bin/setpriv';

/**
 * Starts a program that does not outlive us: where the system can (setpriv of Debian's util-linux), the kernel signals
 * it when we die, `kill -9` included.
 *
 * @param {string} program
 * @param {readonly string[]} args
 * @param {ChildOptions} [options]
 */
export function spawnTied(program, args, options = {}) {
  const { cwd, env = process.env, as, stdio = 'inherit', ownGroup = false, whenWeDie = 'TERM' } = options;
  const tie = existsSync(SETPRIV) ? [SETPRIV, '--pdeathsig', whenWeDie] : [];
  const [first, ...rest] = /** @type {[string, ...string[]]} */ ([...tie, program, ...args]);
  return spawn(first, rest, {
    env,
    stdio,
    detached: ownGroup,
    ...(cwd === undefined ? {} : { cwd }),
    ...(as ? { uid: as.uid, gid: as.gid } : {}),
  });
}

/**
 * Runs a program to its end, in a group of its own so that it can be stopped with all that it has started.
 *
 * @param {string} program
 * @param {readonly string[]} args
 * @param {ChildOptions & { shutdown?: import('./shutdown.mjs').Shutdown, limit?: number }} [options] limit: milliseconds
 *   after which it is stopped
 * @returns {Promise<{ code: number, output: string }>} output: what it wrote to a piped stdout and stderr
 */
export async function runToEnd(program, args, options = {}) {
  const child = spawnTied(program, args, { ...options, ownGroup: true });
  const stop = () => stopGroup(child, 'SIGTERM', 5_000);
  const forget = options.shutdown?.onStop(stop);
  const timer = options.limit === undefined ? undefined : setTimeout(stop, options.limit);
  let output = '';
  for (const stream of [child.stdout, child.stderr]) stream?.on('data', (chunk) => (output += chunk));
  const code = await exitOf(child);
  clearTimeout(timer);
  forget?.();
  return { code, output };
}

/**
 * Runs a program to its end and wants it to succeed.
 *
 * @param {string} what said in the error, as in `npm ci`
 * @param {string} program
 * @param {readonly string[]} args
 * @param {Parameters<typeof runToEnd>[2]} [options]
 */
export async function mustRun(what, program, args, options = {}) {
  const { code, output } = await runToEnd(program, args, options);
  if (code !== 0)
    throw new PlainError(`${what} failed (exit code ${code}).${output ? `\n${output.trimEnd()}` : ''}`);
  return output;
}

/**
 * @param {import('node:child_process').ChildProcess} child
 * @returns {Promise<number>} its exit code; 128 when a signal ended it, 127 when it could not be started
 */
export function exitOf(child) {
  if (child.exitCode !== null) return Promise.resolve(child.exitCode);
  if (child.signalCode !== null) return Promise.resolve(128);
  return new Promise((resolve) => {
    child.once('error', () => resolve(127));
    child.once('close', (code) => resolve(code ?? 128));
  });
}

/**
 * Asks a child to stop, and makes it stop when it has not done so in time.
 *
 * @param {import('node:child_process').ChildProcess} child
 * @param {NodeJS.Signals} signal
 * @param {number} patience milliseconds
 */
export function stopChild(child, signal, patience) {
  return stopBy((name) => child.kill(name), child, signal, patience);
}

/**
 * The same for a child with `ownGroup` and everything that it has started.
 *
 * @param {import('node:child_process').ChildProcess} child
 * @param {NodeJS.Signals} signal
 * @param {number} patience milliseconds
 */
export function stopGroup(child, signal, patience) {
  const { pid } = child;
  if (pid === undefined) return Promise.resolve();
  return stopBy((name) => signalGroup(pid, name), child, signal, patience);
}

/**
 * @param {(name: NodeJS.Signals) => unknown} send
 * @param {import('node:child_process').ChildProcess} child
 * @param {NodeJS.Signals} signal
 * @param {number} patience
 */
async function stopBy(send, child, signal, patience) {
  if (child.exitCode !== null || child.signalCode !== null) return;
  send(signal);
  const timer = setTimeout(() => send('SIGKILL'), patience);
  await exitOf(child);
  clearTimeout(timer);
}

/**
 * @param {number} pid of the group's first process
 * @param {NodeJS.Signals} name
 */
function signalGroup(pid, name) {
  try {
    process.kill(-pid, name);
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'ESRCH') throw error;
  }
}

/**
 * @param {string} program
 * @param {readonly string[]} args
 * @returns {string | null} its output, or null when it failed or does not exist
 */
export function outputOf(program, args) {
  const { status, stdout } = spawnSync(program, args, { encoding: 'utf8', cwd: '/' });
  return status === 0 ? stdout.trim() : null;
}
