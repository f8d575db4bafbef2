// @ts-check
import { PlainError } from './plain-error.mjs';
import { createShutdown, stopOnSignals } from './shutdown.mjs';

/**
 * The frame of start and dev: runs to the end, or until it is told to stop, and leaves nothing running. Exit code 0 after
 * an asked-for stop, 1 after a failure or when one is running already.
 *
 * @param {(shutdown: import('./shutdown.mjs').Shutdown) => Promise<void>} main
 */
export async function runCommand(main) {
  const shutdown = createShutdown();
  stopOnSignals(shutdown, { exitCode: 0 });
  try {
    await main(shutdown);
  } catch (error) {
    // Told to stop, the steps that were under way fail; the signal's own handler ends the process.
    if (shutdown.isStopping()) return;
    console.error(describeError(error));
    process.exitCode = 1;
  }
  await shutdown.stopAll();
}

/**
 * @param {unknown} error
 * @returns {string} one plain sentence where there is one, or all that is known
 */
export function describeError(error) {
  if (error instanceof PlainError) return error.message;
  if (!(error instanceof Error)) return String(error);
  const { code, path } = /** @type {NodeJS.ErrnoException} */ (error);
  if ((code === 'EACCES' || code === 'EPERM') && path !== undefined) {
    return `No permission for ${path}; it may belong to another user who has run this checkout, root perhaps.`;
  }
  return error.stack ?? error.message;
}
