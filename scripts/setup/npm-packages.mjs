// @ts-check
import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { mustRun } from './child-process.mjs';

/** @typedef {{ version?: string, optional?: boolean, link?: boolean }} LockedPackage */

/**
 * Installs the packages of package-lock.json when some are missing or of another version.
 *
 * @param {string} root
 * @param {import('./shutdown.mjs').Shutdown} shutdown
 */
export async function ensurePackages(root, shutdown) {
  if (installedAsLocked(root)) return;
  console.log('Installing the npm packages of package-lock.json …');
  // --include=dev: building and migrating need them even where NODE_ENV says production.
  const args = ['ci', '--include=dev', '--no-audit', '--no-fund'];
  await mustRun('npm ci', 'npm', args, { cwd: root, shutdown });
}

/**
 * @param {string} root
 * @returns {boolean} whether node_modules holds what package-lock.json wants
 */
export function installedAsLocked(root) {
  const locked = readPackages(path.join(root, 'package-lock.json'));
  // npm writes this list at the very end of an installation, so a broken-off one has none.
  const installed = readPackages(path.join(root, 'node_modules', '.package-lock.json'));
  return locked !== null && installed !== null && missingPackages(locked, installed).length === 0;
}

/**
 * @param {Record<string, LockedPackage>} locked
 * @param {Record<string, LockedPackage>} installed
 * @returns {string[]} the packages that an installation lacks or has in another version. Optional ones do not count: they
 *   are left out where they are for another system.
 */
export function missingPackages(locked, installed) {
  return Object.entries(locked)
    .filter(([place, wanted]) => place !== '' && !wanted.optional && !wanted.link)
    .filter(([place, wanted]) => installed[place]?.version !== wanted.version)
    .map(([place]) => place);
}

/**
 * @param {string} file
 * @returns {Record<string, LockedPackage> | null}
 */
function readPackages(file) {
  if (!existsSync(file)) return null;
  try {
    return JSON.parse(readFileSync(file, 'utf8')).packages ?? null;
  } catch {
    return null;
  }
}
