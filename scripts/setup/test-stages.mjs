// @ts-check
import { randomBytes } from 'node:crypto';
import { rmSync } from 'node:fs';
import path from 'node:path';
import { mustRun, runToEnd } from './child-process.mjs';
import { demoSignIn } from './demo-sign-in.mjs';
import { ensureBuild, nextProgram } from './next-build.mjs';
import { serveNext } from './next-server.mjs';
import { PlainError } from './plain-error.mjs';
import { appEnvironment, demoEnvironment, runScript, startDatabase } from './prepare.mjs';
import { ensureSystemProgram, findChromium } from './system-packages.mjs';
import { countOne, countPlaywright, countVitest, readReport } from './test-counts.mjs';

const FIRST_PORT = 3100;
const MINUTE = 60_000;
/** Tests below here need a database; all others need nothing. */
const INTEGRATION_FOLDER = 'tests/server';

/**
 * What the stages of one run share.
 *
 * @typedef {object} TestRun
 * @property {string} root
 * @property {string} folder for reports, logs and the cluster
 * @property {import('./shutdown.mjs').Shutdown} shutdown
 * @property {() => Promise<import('./postgres-cluster.mjs').Cluster>} database the cluster, started when first wanted
 */
/** @typedef {(run: TestRun) => Promise<import('./test-counts.mjs').Count>} Stage */

/**
 * The stages in the order they run, cheap and telling ones first.
 *
 * @type {Readonly<Record<string, Stage>>}
 */
export const STAGES = {
  lint: async (run) => countOne(await npmRun(run, 'lint')),
  types: checkTypes,
  unit: (run) => runVitest(run, 'unit', ['--exclude', `${INTEGRATION_FOLDER}/**`], process.env),
  integration: runIntegration,
  browser: runBrowser,
};

/**
 * @param {readonly string[]} args of the command line: nothing, or `--only` and stage names with commas between
 * @returns {string[]}
 */
export function chosenStages(args) {
  const all = Object.keys(STAGES);
  if (args.length === 0) return all;
  const wanted = args[0] === '--only' && args.length === 2 ? (args[1] ?? '').split(',') : [];
  const unknown = wanted.filter((name) => !all.includes(name));
  if (wanted.length === 0 || unknown.length > 0) {
    throw new PlainError(`Usage: npm test [-- --only STAGE[,STAGE…]], with the stages ${all.join(', ')}.`);
  }
  return all.filter((name) => wanted.includes(name));
}

/**
 * A cluster is started when the first stage wants it, and serves the later ones too.
 *
 * @returns {(request: { folder: string, shutdown: import('./shutdown.mjs').Shutdown }) =>
 *   Promise<import('./postgres-cluster.mjs').Cluster>}
 */
export function databaseOnce() {
  /** @type {ReturnType<typeof startDatabase> | undefined} */
  let started;
  return ({ folder, shutdown }) =>
    (started ??= startDatabase({ purposeFolder: folder, databases: [], shutdown }));
}

/** @type {Stage} */
async function checkTypes(run) {
  // The types of routes and of imported styles are Next's to write, and are not in the repository.
  await mustRun('next typegen', process.execPath, [nextProgram(run.root), 'typegen'], {
    cwd: run.root,
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1' },
    stdio: ['ignore', 'pipe', 'pipe'],
    shutdown: run.shutdown,
  });
  return countOne(await npmRun(run, 'typecheck'));
}

/** @type {Stage} */
async function runIntegration(run) {
  const env = await freshDatabase(run, 'spindleaf_test');
  // Both names, lest one set by the developer lead the tests elsewhere.
  return runVitest(run, 'integration', [INTEGRATION_FOLDER], { ...env, TEST_DATABASE_URL: env.DATABASE_URL });
}

/** @type {Stage} */
async function runBrowser(run) {
  const { root, folder, shutdown } = run;
  const chromium = await ensureSystemProgram(
    { name: 'Chromium', find: findChromium, debianPackage: 'chromium' },
    shutdown,
  );
  const bare = await freshDatabase(run, 'spindleaf_browser_test');
  const demo = demoSignIn(await runScript(root, 'seed', { env: bare, shutdown }));
  const env = demo ? { ...bare, ...demoEnvironment(demo) } : bare;
  await ensureBuild(root, { env, purpose: 'test', shutdown });
  const server = await serveNext(root, {
    mode: 'start',
    firstPort: FIRST_PORT,
    log: path.join(folder, 'server.log'),
    envFor: (address) => ({ ...env, NEXTAUTH_URL: address }),
    shutdown,
  });

  const report = freshReport(folder, 'browser');
  const code = await runTool(run, ['@playwright/test/cli.js', 'test'], {
    ...env,
    E2E_BASE_URL: server.address,
    E2E_REPORT: report,
    CHROMIUM_PATH: chromium,
  });
  await server.stop();
  return countPlaywright(readReport(report), code);
}

/**
 * @param {TestRun} run
 * @param {string} name
 * @returns {Promise<NodeJS.ProcessEnv>} the surroundings of an app with an empty, migrated database
 */
async function freshDatabase({ root, database, shutdown }, name) {
  const cluster = await database();
  await cluster.renewDatabase(name);
  const secret = randomBytes(32).toString('base64url');
  const env = appEnvironment({ databaseUrl: cluster.url(name), secret });
  await runScript(root, 'migrate', { env, shutdown });
  return env;
}

/**
 * @param {TestRun} run
 * @param {string} name
 * @param {readonly string[]} args
 * @param {NodeJS.ProcessEnv} env
 */
async function runVitest(run, name, args, env) {
  const report = freshReport(run.folder, name);
  const reporters = ['--reporter=dot', '--reporter=json', `--outputFile.json=${report}`];
  const code = await runTool(run, ['vitest/vitest.mjs', 'run', ...reporters, ...args], env);
  return countVitest(readReport(report), code);
}

/**
 * @param {TestRun} run
 * @param {readonly [string, ...string[]]} command a program's file in node_modules, and its arguments
 * @param {NodeJS.ProcessEnv} env
 */
async function runTool({ root, shutdown }, [program, ...args], env) {
  const file = path.join(root, 'node_modules', program);
  // A log is read as text; colour codes for each dot of it would be most of it.
  const plain = process.stdout.isTTY ? {} : { NO_COLOR: '1', FORCE_COLOR: undefined };
  const options = { cwd: root, env: { ...env, ...plain }, shutdown, limit: 10 * MINUTE };
  return (await runToEnd(process.execPath, [file, ...args], options)).code;
}

/**
 * @param {TestRun} run
 * @param {string} script
 */
async function npmRun({ root, shutdown }, script) {
  const options = { cwd: root, shutdown, limit: 10 * MINUTE };
  return (await runToEnd('npm', ['run', '--silent', script], options)).code;
}

/**
 * @param {string} folder
 * @param {string} name
 */
function freshReport(folder, name) {
  const file = path.join(folder, `${name}.json`);
  rmSync(file, { force: true });
  return file;
}
