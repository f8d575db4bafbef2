// @ts-check
import { describeError } from './command-line.mjs';
import { ensurePackages } from './npm-packages.mjs';
import { lockFile } from './next-build.mjs';
import { PlainError } from './plain-error.mjs';
import { dataFolder, projectRoot } from './project-places.mjs';
import { releaseLock, takeLock } from './run-lock.mjs';
import { sumCounts } from './test-counts.mjs';
import { STAGES, chosenStages, databaseOnce } from './test-stages.mjs';

/** @typedef {import('./test-counts.mjs').Count} Count */

/**
 * Runs every wanted stage, whatever became of the ones before it.
 *
 * @param {readonly string[]} args
 * @param {import('./shutdown.mjs').Shutdown} shutdown
 * @returns {Promise<Count>}
 */
export async function runTests(args, shutdown) {
  const names = chosenStages(args);
  const folder = dataFolder('test');
  holdLock(shutdown);
  await ensurePackages(projectRoot, shutdown);

  const start = databaseOnce();
  const run = { root: projectRoot, folder, shutdown, database: () => start({ folder, shutdown }) };
  /** @type {{ name: string, count: Count, seconds: number }[]} */
  const results = [];
  for (const name of names) {
    if (shutdown.isStopping()) break;
    console.log(`\n── ${name}`);
    const began = performance.now();
    const count = await countOrFail(STAGES[name], run);
    results.push({ name, count, seconds: (performance.now() - began) / 1000 });
    console.log(describeStage(/** @type {typeof results[number]} */ (results.at(-1))));
  }
  console.log(`\n${results.map(describeStage).join('\n')}`);
  return sumCounts(results.map(({ count }) => count));
}

/**
 * @param {import('./test-stages.mjs').Stage | undefined} stage
 * @param {import('./test-stages.mjs').TestRun} run
 * @returns {Promise<Count>} one failure for a stage that could not even be run
 */
async function countOrFail(stage, run) {
  try {
    return stage ? await stage(run) : { passed: 0, failed: 1 };
  } catch (error) {
    console.error(describeError(error));
    return { passed: 0, failed: 1 };
  }
}

/** @param {{ name: string, count: Count, seconds: number }} result */
function describeStage({ name, count, seconds }) {
  const { passed, failed } = count;
  return `${name.padEnd(12)} ${passed} passed, ${failed} failed, ${seconds.toFixed(0)} s`;
}

/** @param {import('./shutdown.mjs').Shutdown} shutdown */
function holdLock(shutdown) {
  const file = lockFile('test');
  const lock = takeLock(file, 'npm test');
  if (!lock.taken) throw new PlainError(`The tests are already running here (process ${lock.holder.pid}).`);
  shutdown.onStop(() => releaseLock(file));
}
