// @ts-check
import path from 'node:path';
import { demoSignIn } from './demo-sign-in.mjs';
import { ensurePackages } from './npm-packages.mjs';
import { ensureBuild, lockFile } from './next-build.mjs';
import { serveNext } from './next-server.mjs';
import { PlainError } from './plain-error.mjs';
import { appEnvironment, runScript, startDatabase } from './prepare.mjs';
import { dataFolder, projectRoot } from './project-places.mjs';
import { announce, releaseLock, takeLock } from './run-lock.mjs';
import { keptSecret } from './secret.mjs';

const FIRST_PORT = 3000;

/**
 * Brings the app up from whatever state the checkout is in, and stays until it ends or is stopped.
 *
 * @param {'start' | 'dev'} mode
 * @param {import('./shutdown.mjs').Shutdown} shutdown
 */
export async function runApp(mode, shutdown) {
  const folder = dataFolder('app');
  holdLock(mode, shutdown);
  await ensurePackages(projectRoot, shutdown);

  // The second one is for developers who run single tests against a database by hand; `npm test` has its own cluster.
  const databases = ['spindleaf', 'spindleaf_test'];
  const database = await startDatabase({ purposeFolder: folder, databases, shutdown });
  const settings = {
    databaseUrl: database.url('spindleaf'),
    secret: keptSecret(path.join(folder, 'sign-in-secret')),
  };
  const seeded = await migrateAndSeed(appEnvironment(settings), shutdown);
  const known = { ...settings, demo: demoSignIn(seeded) };
  const env = appEnvironment(known);
  if (mode === 'start') await ensureBuild(projectRoot, { env, purpose: 'app', shutdown });

  const server = await serveNext(projectRoot, {
    mode,
    firstPort: FIRST_PORT,
    log: mode === 'start' ? path.join(folder, 'server.log') : null,
    envFor: (address) => appEnvironment({ ...known, address }),
    shutdown,
  });
  // Told to stop at the last moment: nothing to announce.
  if (shutdown.isStopping()) return;
  announce(lockFile('app'), server.address);
  console.log(`\nSpindleaf is running at ${server.address}\n${seeded.trimEnd()}\nStop it with Ctrl-C.`);

  const what = await Promise.race([
    server.ended.then(() => 'The app'),
    database.ended.then(() => 'PostgreSQL'),
  ]);
  if (!shutdown.isStopping()) throw new PlainError(`${what} has ended by itself; see the logs in ${folder}.`);
}

/**
 * @param {NodeJS.ProcessEnv} env
 * @param {import('./shutdown.mjs').Shutdown} shutdown
 * @returns {Promise<string>} what the seed says of the demo's accounts
 */
async function migrateAndSeed(env, shutdown) {
  await runScript(projectRoot, 'migrate', { env, shutdown });
  return runScript(projectRoot, 'seed', { env, shutdown });
}

/**
 * @param {'start' | 'dev'} mode
 * @param {import('./shutdown.mjs').Shutdown} shutdown
 */
function holdLock(mode, shutdown) {
  const file = lockFile('app');
  const lock = takeLock(file, mode === 'start' ? 'npm start' : 'npm run dev');
  if (lock.taken) {
    shutdown.onStop(() => releaseLock(file));
    return;
  }
  const { command, pid, address } = lock.holder;
  const where = address === null ? 'and is still starting' : `at ${address}`;
  throw new PlainError(`Spindleaf is already running here ${where} ("${command}", process ${pid}).`);
}
