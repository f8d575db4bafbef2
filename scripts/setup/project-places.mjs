// @ts-check
import { chmodSync, mkdirSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder that holds package.json. */
export const projectRoot = path.resolve(fileURLToPath(new URL('../..', import.meta.url)));

/**
 * The folder for everything that a run leaves behind: `.data/app` for start and dev, `.data/test` for the tests, each
 * with a database cluster, logs and a lock of its own, so that tests never meet a maker's work.
 *
 * @param {'app' | 'test'} purpose
 * @param {string} [root]
 * @returns {string} the folder, made when missing
 */
export function dataFolder(purpose, root = projectRoot) {
  const folder = path.join(root, '.data', purpose);
  mkdirSync(folder, { recursive: true });
  // Started by root, the database runs as another user, who has to pass through here whatever the umask was. What is
  // secret in these folders is closed file by file.
  for (const passage of [path.dirname(folder), folder]) chmodIfOurs(passage, 0o755);
  return folder;
}

/**
 * @param {string} folder
 * @param {number} mode
 */
function chmodIfOurs(folder, mode) {
  try {
    chmodSync(folder, mode);
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EPERM') throw error;
  }
}
