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
 * Stops everything and ends the process on Ctrl-C, on `kill`, when the terminal goes, and when the npm that started us has
 * been killed: it can hand on a SIGTERM, but not a SIGKILL.
 *
 * @param {Shutdown} shutdown
 * @param {{ exitCode: number, say?: (text: string) => void }} options
 */
export function stopOnSignals(shutdown, { exitCode, say = console.log }) {
  const stop = () => {
    if (shutdown.isStopping()) return;
    say('\nStopping …');
    void shutdown.stopAll().then(() => process.exit(exitCode));
  };
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) process.on(signal, stop);
  if (process.env.npm_lifecycle_event === undefined) return;
  const npm = process.ppid;
  setInterval(() => process.ppid !== npm && stop(), 500).unref();
}
