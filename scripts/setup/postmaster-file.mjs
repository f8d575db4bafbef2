// @ts-check
import { readFileSync } from 'node:fs';
import path from 'node:path';

/** @typedef {{ pid: number, port: number | null, ready: boolean }} Postmaster */

/**
 * @param {string} cluster the data folder
 * @returns {Postmaster | null} what the server that runs, or ran, there wrote of itself
 */
export function readPostmasterFile(cluster) {
  try {
    return parsePostmaster(readFileSync(path.join(cluster, 'postmaster.pid'), 'utf8'));
  } catch {
    return null;
  }
}

/**
 * The lines of postmaster.pid, see "Database File Layout" in PostgreSQL's manual: process number, data folder, start time,
 * port, socket folder, listen address, shared memory, and (since version 10) the status.
 *
 * @param {string} text
 * @returns {Postmaster | null}
 */
export function parsePostmaster(text) {
  const lines = text.split('\n').map((line) => line.trim());
  const pid = Number(lines[0]);
  if (!Number.isSafeInteger(pid) || pid <= 0) return null;
  return { pid, port: lines[3] ? Number(lines[3]) : null, ready: lines[7] === 'ready' };
}
