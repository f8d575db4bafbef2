// @ts-check
import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { mustRun } from './child-process.mjs';
import { PlainError } from './plain-error.mjs';
import { dataFolder } from './project-places.mjs';
import { liveHolder } from './run-lock.mjs';
import { sourceHash } from './source-hash.mjs';

/** @param {string} root */
export function nextProgram(root) {
  return path.join(root, 'node_modules', 'next', 'dist', 'bin', 'next');
}

/**
 * Builds the app when its sources have changed since the last build.
 *
 * @param {string} root
 * @param {{ env: NodeJS.ProcessEnv, purpose: 'app' | 'test', shutdown: import('./shutdown.mjs').Shutdown }} options
 */
export async function ensureBuild(root, { env, purpose, shutdown }) {
  const stamp = path.join(root, '.next', 'built-from');
  const wanted = sourceHash(root);
  if (isBuilt(root, stamp, wanted)) return;

  refuseUnderRunningApp(purpose);
  console.log('Building the app …');
  rmSync(stamp, { force: true });
  await mustRun('next build', process.execPath, [nextProgram(root), 'build'], { cwd: root, env, shutdown });
  writeFileSync(stamp, wanted);
}

/**
 * @param {string} root
 * @param {string} stamp
 * @param {string} wanted
 */
function isBuilt(root, stamp, wanted) {
  if (!existsSync(path.join(root, '.next', 'BUILD_ID')) || !existsSync(stamp)) return false;
  return readFileSync(stamp, 'utf8') === wanted;
}

/**
 * Start and test serve the same build; replacing it under a server would break the pages that it still gives out.
 *
 * @param {'app' | 'test'} purpose the one that wants to build
 */
function refuseUnderRunningApp(purpose) {
  const other = purpose === 'app' ? 'test' : 'app';
  const holder = liveHolder(lockFile(other));
  // `npm run dev` compiles into a folder of its own.
  if (holder === null || holder.command === 'npm run dev') return;
  throw new PlainError(
    `The sources have changed since the build that "${holder.command}" (process ${holder.pid}) is serving here; ` +
      'stop it first.',
  );
}

/** @param {'app' | 'test'} purpose */
export function lockFile(purpose) {
  return path.join(dataFolder(purpose), 'running.json');
}
