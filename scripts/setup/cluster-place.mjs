// @ts-check
import { createHash } from 'node:crypto';
import { spawnSync } from 'node:child_process';
import { chmodSync, existsSync, mkdirSync, statSync } from 'node:fs';
import path from 'node:path';
import { outputOf } from './child-process.mjs';
import { PlainError } from './plain-error.mjs';

const FALLBACK_ROOT = '/var/lib/spindleaf';

/**
 * Where a cluster lies and who runs it: `runAs` is null when we run it ourselves.
 *
 * @typedef {{ folder: string, runAs: import('./child-process.mjs').Identity | null }} ClusterPlace
 */

/**
 * A plain user keeps the cluster in the project and runs it. PostgreSQL refuses to run as root, so root runs it as the
 * user `postgres` that Debian's package brings; where that user cannot reach the project (below /root, say), the cluster
 * lies in a folder of the project's own under /var/lib.
 *
 * @param {string} purposeFolder `.data/app` or `.data/test`
 * @returns {ClusterPlace}
 */
export function clusterPlace(purposeFolder) {
  const inProject = path.join(purposeFolder, 'postgres');
  if (process.getuid?.() !== 0) {
    wantOwnFolder(inProject);
    return { folder: inProject, runAs: null };
  }
  // Made by a plain user before: it stays theirs, or they could not start it again.
  const owner = ownerOf(inProject);
  if (owner !== null && owner.uid !== 0) return { folder: inProject, runAs: owner };

  const runAs = postgresUser();
  const outside = fallbackFolder(purposeFolder);
  if (existsSync(outside)) return { folder: outside, runAs };
  if (canPass(purposeFolder, runAs)) return { folder: inProject, runAs };
  makeFallbackParents(outside);
  return { folder: outside, runAs };
}

/**
 * @param {string} purposeFolder
 * @returns {string} a folder below /var/lib that belongs to this checkout and purpose alone
 */
export function fallbackFolder(purposeFolder) {
  const mark = createHash('sha256').update(purposeFolder).digest('hex').slice(0, 16);
  return path.join(FALLBACK_ROOT, mark, 'postgres');
}

/** @param {string} folder */
function wantOwnFolder(folder) {
  const owner = ownerOf(folder);
  if (owner === null || owner.uid === process.getuid?.()) return;
  throw new PlainError(
    `The database in ${folder} belongs to another user (number ${owner.uid}); start as the user who started first, ` +
      'or use a checkout of your own.',
  );
}

/**
 * @param {string} folder
 * @returns {import('./child-process.mjs').Identity | null} null when it does not exist
 */
function ownerOf(folder) {
  const found = statSync(folder, { throwIfNoEntry: false });
  return found ? { uid: found.uid, gid: found.gid } : null;
}

/** @returns {import('./child-process.mjs').Identity} */
function postgresUser() {
  const [uid, gid] = [outputOf('id', ['-u', 'postgres']), outputOf('id', ['-g', 'postgres'])];
  if (uid === null || gid === null) {
    throw new PlainError(
      'PostgreSQL does not run as root and there is no user "postgres" to run it as; ' +
        'start as a plain user, or as root make one with: adduser --system --group postgres',
    );
  }
  return { uid: Number(uid), gid: Number(gid) };
}

/**
 * Asks the system itself, since access lists and mounts decide too.
 *
 * @param {string} folder
 * @param {import('./child-process.mjs').Identity} user
 */
function canPass(folder, user) {
  return spawnSync('test', ['-x', folder], { ...user, cwd: '/' }).status === 0;
}

/** @param {string} folder */
function makeFallbackParents(folder) {
  const parent = path.dirname(folder);
  mkdirSync(parent, { recursive: true });
  for (const passage of [FALLBACK_ROOT, parent]) chmodSync(passage, 0o755);
}
