// @ts-check
import { describeError } from './setup/command-line.mjs';
import { runTests } from './setup/run-tests.mjs';
import { createShutdown, stopOnSignals } from './setup/shutdown.mjs';

const shutdown = createShutdown();
stopOnSignals(shutdown, { exitCode: 1 });

let count = { passed: 0, failed: 1 };
try {
  count = await runTests(process.argv.slice(2), shutdown);
} catch (error) {
  if (!shutdown.isStopping()) console.error(describeError(error));
}
await shutdown.stopAll();
process.exitCode = count.failed === 0 && count.passed > 0 ? 0 : 1;
console.log(`${count.passed} passed, ${count.failed} failed`);
