// @ts-check
import { createHash } from 'node:crypto';
import { mkdirSync, readFileSync, renameSync, statSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import os from 'node:os';
import path from 'node:path';

/**
 * What a bundle was made of: each source with its time and size, and the bundle's file.
 *
 * @typedef {{ file: string, inputs: Record<string, string> }} BundleRecord
 */

/**
 * The path of a bundle of `entry` with all that it imports, made now unless the kept one was made of exactly the
 * sources that lie there.
 *
 * @param {string} root of the project; the cache lies in its node_modules
 * @param {string} entry absolute path of a TypeScript file
 * @returns {Promise<string>}
 */
export async function freshBundle(root, entry) {
  const name = path.basename(entry, path.extname(entry));
  const folder = cacheFolder(root);
  const recordFile = path.join(folder, `${name}.json`);
  const kept = readRecord(recordFile);
  if (kept && isCurrent(root, kept)) return kept.file;
  const { code, inputs } = await bundle(root, entry);
  // Named by what it holds: a run that still uses an older bundle keeps it.
  const hash = createHash('sha256').update(code).digest('hex').slice(0, 16);
  const file = path.join(folder, `${name}-${hash}.mjs`);
  writeWhole(file, code);
  writeWhole(recordFile, JSON.stringify({ file, inputs }));
  return file;
}

/**
 * @param {string} root
 * @param {string} entry
 */
async function bundle(root, entry) {
  const esbuild = loadEsbuild();
  const result = await esbuild.build({
    entryPoints: [entry],
    absWorkingDir: root,
    bundle: true,
    write: false,
    metafile: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    alias: { '@': root.replace(/[/\\]$/, '') },
    logLevel: 'error',
    // Packages in CommonJS ask for `require` even where nothing is required at run time.
    banner: {
      js: "import { createRequire as makeRequire } from 'node:module'; const require = makeRequire(import.meta.url);",
    },
  });
  const output = result.outputFiles[0];
  if (!output) throw new Error(`Bundling ${entry} gave nothing`);
  /** @type {Record<string, string>} */
  const inputs = {};
  for (const input of Object.keys(result.metafile.inputs))
    inputs[input] = stamp(path.join(root, input)) ?? '';
  return { code: output.text, inputs };
}

/**
 * esbuild comes with tsx, which runs all other scripts.
 *
 * @returns {typeof import('esbuild')}
 */
function loadEsbuild() {
  const require = createRequire(import.meta.url);
  return createRequire(require.resolve('tsx/package.json'))('esbuild');
}

/** @param {string} root */
function cacheFolder(root) {
  const usual = path.join(root, 'node_modules', '.cache', 'spindleaf');
  try {
    mkdirSync(usual, { recursive: true });
    return usual;
  } catch {
    // A read-only checkout: bundles hold all they import, so they run from anywhere.
    const owner = createHash('sha256').update(root).digest('hex').slice(0, 16);
    const spare = path.join(os.tmpdir(), `spindleaf-${os.userInfo().uid}-${owner}`);
    mkdirSync(spare, { recursive: true, mode: 0o700 });
    return spare;
  }
}

/**
 * @param {string} file
 * @returns {BundleRecord | null}
 */
function readRecord(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}

/**
 * @param {string} root
 * @param {BundleRecord} record
 */
function isCurrent(root, { file, inputs }) {
  if (stamp(file) === null) return false;
  return Object.entries(inputs).every(([input, made]) => stamp(path.join(root, input)) === made);
}

/**
 * @param {string} file
 * @returns {string | null} null where there is none
 */
function stamp(file) {
  const stats = statSync(file, { throwIfNoEntry: false });
  return stats ? `${stats.mtimeMs} ${stats.size}` : null;
}

/**
 * Written beside and renamed: a second run never reads half a file.
 *
 * @param {string} file
 * @param {string} text
 */
function writeWhole(file, text) {
  const part = `${file}.${process.pid}.part`;
  writeFileSync(part, text);
  renameSync(part, file);
}
