// @ts-check
import path from 'node:path';
import { mustRun } from './child-process.mjs';
import { startCluster } from './postgres-cluster.mjs';
import { installedPostgres } from './postgres-programs.mjs';
import { ensureSystemProgram } from './system-packages.mjs';

/** Off 5432, where the system's own PostgreSQL may run. */
const FIRST_DATABASE_PORT = 54_310;

/**
 * Finds or installs PostgreSQL, starts a cluster of our own and makes its databases.
 *
 * @param {object} request
 * @param {string} request.purposeFolder
 * @param {readonly string[]} request.databases
 * @param {import('./shutdown.mjs').Shutdown} request.shutdown
 */
export async function startDatabase({ purposeFolder, databases, shutdown }) {
  const find = () => {
    const found = installedPostgres();
    return found.length > 0 ? found : null;
  };
  const installed = await ensureSystemProgram(
    { name: 'PostgreSQL', find, debianPackage: 'postgresql' },
    shutdown,
  );
  const cluster = await startCluster({
    purposeFolder,
    installed,
    firstPort: FIRST_DATABASE_PORT,
    shutdown,
  });
  for (const name of databases) await cluster.ensureDatabase(name);
  return cluster;
}

/**
 * What the app needs to know of its surroundings.
 *
 * @typedef {object} Known
 * @property {string} databaseUrl
 * @property {string} secret signs session cookies
 * @property {{ email: string, password: string } | null} [demo] the account that the landing page offers
 * @property {string} [address]
 */
/**
 * @param {Known} known
 * @returns {NodeJS.ProcessEnv}
 */
export function appEnvironment({ databaseUrl, secret, demo, address }) {
  return {
    ...process.env,
    DATABASE_URL: databaseUrl,
    NEXTAUTH_SECRET: secret,
    ...(demo ? demoEnvironment(demo) : {}),
    ...(address ? { NEXTAUTH_URL: address } : {}),
    NEXT_TELEMETRY_DISABLED: '1',
  };
}

/** @param {{ email: string, password: string }} demo */
export function demoEnvironment({ email, password }) {
  return { SPINDLEAF_DEMO_EMAIL: email, SPINDLEAF_DEMO_PASSWORD: password };
}

/**
 * Runs one of the project's own TypeScript scripts.
 *
 * @param {string} root
 * @param {string} name such as `migrate`
 * @param {{ env: NodeJS.ProcessEnv, shutdown: import('./shutdown.mjs').Shutdown }} options
 * @returns {Promise<string>} what it printed
 */
export function runScript(root, name, { env, shutdown }) {
  const file = path.join('scripts', `${name}.ts`);
  return mustRun(`scripts/${name}.ts`, process.execPath, ['--import', 'tsx', file], {
    cwd: root,
    env,
    stdio: ['ignore', 'pipe', 'pipe'],
    shutdown,
  });
}
