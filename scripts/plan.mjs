// @ts-check
/**
 * `npm run --silent plan -- …`: bundles scripts/plan-command.ts and runs it. The bundle is made anew whenever a source has
 * changed, and kept under node_modules/.cache, so that starting costs little and nothing stale is ever run.
 */
import path from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { freshBundle } from './bundle-script.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
const bundle = await freshBundle(root, path.join(root, 'scripts', 'plan-command.ts'));
/** @type {typeof import('./plan-command')} */
const { runPlan } = await import(pathToFileURL(bundle).href);
try {
  process.exitCode = runPlan(process.argv.slice(2), {
    fonts: path.join(root, 'public', 'fonts'),
    folder: process.cwd(),
    print: (text) => process.stdout.write(text),
    complain: (text) => process.stderr.write(text),
  });
} catch (error) {
  // A fault of ours must not look like a finding (1) or a document that cannot be used (2).
  console.error(error);
  process.exitCode = 3;
}
