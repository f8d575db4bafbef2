// @ts-check
import { existsSync } from 'node:fs';
import { mustRun } from './child-process.mjs';
import { PlainError } from './plain-error.mjs';

/**
 * Makes sure that a program of the system is there: root installs it, everybody else is told how.
 *
 * @template T
 * @param {{ name: string, find: () => T | null, debianPackage: string }} wanted
 * @param {import('./shutdown.mjs').Shutdown} shutdown
 * @returns {Promise<T>} what `find` found
 */
export async function ensureSystemProgram({ name, find, debianPackage }, shutdown) {
  const present = find();
  if (present !== null) return present;

  const line = `apt-get install -y --no-install-recommends ${debianPackage}`;
  if (process.getuid?.() !== 0 || !existsSync('/usr/bin/apt-get')) {
    throw new PlainError(`${name} is missing; as root, install it with: ${line}`);
  }
  console.log(`${name} is missing; installing Debian's package ${debianPackage} …`);
  const options = {
    cwd: '/',
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    stdio: /** @type {import('node:child_process').StdioOptions} */ (['ignore', 'pipe', 'pipe']),
    shutdown,
  };
  await mustRun('apt-get update', 'apt-get', ['update'], options);
  await mustRun(line, 'apt-get', line.split(' ').slice(1), options);

  const installed = find();
  if (installed === null) throw new PlainError(`${name} was installed with "${line}" but cannot be found.`);
  return installed;
}

/** @returns {string | null} Debian's Chromium, or the browser that CHROMIUM_PATH names */
export function findChromium() {
  const file = process.env.CHROMIUM_PATH ?? '/usr/bin/chromium';
  return existsSync(file) ? file : null;
}
