// @ts-check
import { randomBytes } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';

/**
 * A secret that is made once and kept in a file only its owner may read.
 *
 * @param {string} file
 * @returns {string} 43 characters that need no quoting anywhere
 */
export function keptSecret(file) {
  const kept = readSecret(file);
  if (kept !== null) return kept;
  const made = randomBytes(32).toString('base64url');
  writeFileSync(file, made, { mode: 0o600 });
  return made;
}

/** @param {string} file */
function readSecret(file) {
  try {
    const text = readFileSync(file, 'utf8').trim();
    return /^[\w-]{43}$/.test(text) ? text : null;
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code === 'ENOENT') return null;
    throw error;
  }
}
