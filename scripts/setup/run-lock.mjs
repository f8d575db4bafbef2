// @ts-check
import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { birthMark, isAlive } from './process-identity.mjs';

/**
 * What the lock file of a run says: who holds it and, once the run has one, where it answers.
 *
 * @typedef {{ pid: number, birth: string | null, command: string, address: string | null }} Holder
 */

/**
 * Takes the lock, or tells who holds it. A lock whose process is gone (killed, power lost), or whose number now belongs
 * to another process, is taken over.
 *
 * @param {string} file
 * @param {string} command what the person typed, such as `npm start`
 * @returns {{ taken: true } | { taken: false, holder: Holder }}
 */
export function takeLock(file, command) {
  /** @type {Holder} */
  const mine = { pid: process.pid, birth: birthMark(process.pid), command, address: null };
  const draft = `${file}.${process.pid}`;
  writeFileSync(draft, JSON.stringify(mine));
  try {
    for (;;) {
      // A hard link is made whole or not at all, so nobody ever reads half a lock.
      if (linkIfFree(draft, file)) return { taken: true };
      const holder = readLock(file);
      if (holder !== null && isHeldBy(holder)) return { taken: false, holder };
      setAside(file, holder);
    }
  } finally {
    rmSync(draft, { force: true });
  }
}

/**
 * @param {string} file
 * @returns {Holder | null} null when there is no lock, or none that can be read
 */
export function readLock(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch (error) {
    // Cut short by a power loss, or gone. Anything else (no right to read it) is not for guessing.
    const gone = /** @type {NodeJS.ErrnoException} */ (error).code === 'ENOENT';
    if (gone || error instanceof SyntaxError) return null;
    throw error;
  }
}

/**
 * @param {string} file
 * @returns {Holder | null} the live holder of a lock
 */
export function liveHolder(file) {
  const holder = readLock(file);
  return holder !== null && isHeldBy(holder) ? holder : null;
}

/**
 * Says in the lock where the run answers.
 *
 * @param {string} file
 * @param {string} address
 */
export function announce(file, address) {
  const holder = readLock(file);
  if (holder?.pid !== process.pid) return;
  const draft = `${file}.${process.pid}`;
  writeFileSync(draft, JSON.stringify({ ...holder, address }));
  renameSync(draft, file);
}

/** @param {string} file */
export function releaseLock(file) {
  if (readLock(file)?.pid === process.pid) rmSync(file, { force: true });
}

/** @param {Holder} holder */
function isHeldBy(holder) {
  if (!isAlive(holder.pid)) return false;
  const birth = birthMark(holder.pid);
  return birth === null || holder.birth === null || birth === holder.birth;
}

/**
 * @param {string} draft
 * @param {string} file
 */
function linkIfFree(draft, file) {
  try {
    linkSync(draft, file);
    return true;
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code === 'EEXIST') return false;
    throw error;
  }
}

/**
 * Removes a dead lock, unless another start has replaced it in the meantime.
 *
 * @param {string} file
 * @param {Holder | null} dead
 */
function setAside(file, dead) {
  const aside = `${file}.dead-${process.pid}`;
  try {
    renameSync(file, aside);
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code === 'ENOENT') return;
    throw error;
  }
  const moved = readLock(aside);
  if (moved !== null && moved.pid !== dead?.pid) linkIfFree(aside, file);
  rmSync(aside, { force: true });
}
