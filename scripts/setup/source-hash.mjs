// @ts-check
import { createHash } from 'node:crypto';
import { readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';

/** At the project's top: what no page is built from, or what building itself writes. */
const NOT_BUILT_FROM = new Set([
  '.ci',
  '.data',
  '.git',
  '.next',
  'coverage',
  'e2e',
  'node_modules',
  'out',
  'playwright-report',
  'scripts',
  'test-results',
  'tests',
  'next-env.d.ts',
]);
const NOT_BUILT_FROM_ENDINGS = ['.md', '.tsbuildinfo'];

/**
 * @param {string} root
 * @returns {string} a hash over the names and the content of all files that a build may read, and the Node version
 */
export function sourceHash(root) {
  const hash = createHash('sha256').update(process.version);
  for (const file of builtFrom(root)) {
    const content = readFileSync(path.join(root, file));
    // The length keeps two files from running into one another.
    hash.update(`\0${file}\0${content.length}\0`).update(content);
  }
  return hash.digest('hex');
}

/**
 * @param {string} root
 * @returns {string[]} the files, relative to the root, in an order that does not depend on the system
 */
export function builtFrom(root) {
  const top = readdirSync(root, { withFileTypes: true }).filter(
    ({ name }) =>
      !NOT_BUILT_FROM.has(name) && !NOT_BUILT_FROM_ENDINGS.some((ending) => name.endsWith(ending)),
  );
  return top.flatMap((entry) => filesOf(root, entry.name, entry)).sort();
}

/**
 * @param {string} root
 * @param {string} relative
 * @param {import('node:fs').Dirent} entry
 * @returns {string[]}
 */
function filesOf(root, relative, entry) {
  if (entry.isFile()) return [relative];
  if (!entry.isDirectory()) return [];
  return readdirSync(path.join(root, relative), { withFileTypes: true }).flatMap((inner) =>
    filesOf(root, path.join(relative, inner.name), inner),
  );
}
