import 'server-only';
import { CancelledError } from '@/lib/base/cancel';

/**
 * Work by key whose results are kept, the least used given up first. Callers who want the same at the same time share
 * one run; it is cancelled only when the last of them has gone.
 */
export interface SharedWork<V> {
  get(key: string, signal: AbortSignal, work: (signal: AbortSignal) => Promise<V>): Promise<V>;
}

interface Run<V> {
  readonly result: Promise<V>;
  readonly stop: AbortController;
  waiting: number;
}

/** `sizeOf` is in bytes; results together take at most `limit`. */
export function sharedWork<V>(limit: number, sizeOf: (value: V) => number): SharedWork<V> {
  const kept = new Map<string, V>(); // in the order of use, oldest first
  const runs = new Map<string, Run<V>>();
  let size = 0;

  function keep(key: string, value: V): void {
    kept.set(key, value);
    size += sizeOf(value);
    for (const [oldKey, old] of kept) {
      if (size <= limit) return;
      kept.delete(oldKey);
      size -= sizeOf(old);
    }
  }

  function start(key: string, work: (signal: AbortSignal) => Promise<V>): Run<V> {
    const stop = new AbortController();
    const result = work(stop.signal).then((value) => {
      keep(key, value);
      return value;
    });
    const run: Run<V> = { result, stop, waiting: 0 };
    runs.set(key, run);
    const done = () => {
      if (runs.get(key) === run) runs.delete(key);
    };
    result.then(done, done);
    return run;
  }

  return {
    async get(key, signal, work) {
      const value = kept.get(key);
      if (value !== undefined) {
        kept.delete(key);
        kept.set(key, value);
        return value;
      }
      const run = runs.get(key) ?? start(key, work);
      run.waiting++;
      try {
        return await Promise.race([run.result, givenUp(signal)]);
      } finally {
        run.waiting--;
        if (run.waiting === 0 && signal.aborted) {
          // Whoever asks next starts anew instead of sharing a run that is being stopped.
          if (runs.get(key) === run) runs.delete(key);
          run.stop.abort();
        }
      }
    },
  };
}

function givenUp(signal: AbortSignal): Promise<never> {
  return new Promise((_, reject) => {
    if (signal.aborted) reject(new CancelledError());
    signal.addEventListener('abort', () => reject(new CancelledError()), { once: true });
  });
}
