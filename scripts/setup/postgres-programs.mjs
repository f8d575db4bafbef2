// @ts-check
import { existsSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { PlainError } from './plain-error.mjs';

/** Debian keeps each major version's server programs in a folder of its own, off the PATH. */
const VERSIONS_FOLDER = '/usr/lib/postgresql';
const NEEDED = ['initdb', 'postgres', 'psql'];

/** @typedef {{ major: number, bin: string }} PostgresPrograms */

/**
 * @param {string} [folder]
 * @returns {PostgresPrograms[]} the complete installations, newest first
 */
export function installedPostgres(folder = VERSIONS_FOLDER) {
  if (!existsSync(folder)) return [];
  return readdirSync(folder)
    .filter((name) => /^\d+$/.test(name))
    .map((name) => ({ major: Number(name), bin: path.join(folder, name, 'bin') }))
    .filter(({ bin }) => NEEDED.every((program) => existsSync(path.join(bin, program))))
    .sort((a, b) => b.major - a.major);
}

/**
 * The installation to run a cluster with: the one that made it, for a data folder opens only under its own major version,
 * and the newest for a new cluster.
 *
 * @param {readonly PostgresPrograms[]} installed newest first, at least one
 * @param {number | null} clusterMajor of an existing cluster
 * @param {string} cluster its folder, for the message
 * @returns {PostgresPrograms}
 */
export function choosePostgres(installed, clusterMajor, cluster) {
  const chosen = clusterMajor === null ? installed[0] : installed.find((one) => one.major === clusterMajor);
  if (chosen) return chosen;
  throw new PlainError(
    `The database in ${cluster} was made by PostgreSQL ${clusterMajor}, which is not installed; ` +
      `as root, install it with: apt-get install -y --no-install-recommends postgresql-${clusterMajor}`,
  );
}
