// @ts-check

/**
 * What has been started, to be stopped in the opposite order: once, whatever the reason.
 *
 * @typedef {object} Shutdown
 * @property {(stop: () => unknown) => () => void} onStop adds something to stop; the answer takes it off again
 * @property {() => Promise<void>} stopAll
 * @property {() => boolean} isStopping
 */

/** @returns {Shutdown} */
export function createShutdown() {
  /** @type {Set<() => unknown>} */
  const steps = new Set();
  /** @type {Promise<void> | null} */
  let stopping = null;

  const stopInOrder = async () => {
    for (const step of [...steps].reverse()) {
      steps.delete(step);
      try {
        await step();
      } catch (error) {
        console.error(`While stopping: ${error instanceof Error ? error.message : error}`);
      }
    }
  };
  return {
    onStop(stop) {
      steps.add(stop);
      return () => steps.delete(stop);
    },
    stopAll: () => (stopping ??= stopInOrder()),
    isStopping: () => stopping !== null,
  };
}

/**
 * Stops everything and ends the process on Ctrl-C, on `kill`, and when the terminal goes.
 *
 * @param {Shutdown} shutdown
 * @param {{ exitCode: number, say?: (text: string) => void }} options
 */
export function stopOnSignals(shutdown, { exitCode, say = console.log }) {
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => {
      if (shutdown.isStopping()) return;
      say('\nStopping …');
      void shutdown.stopAll().then(() => process.exit(exitCode));
    });
  }
}
