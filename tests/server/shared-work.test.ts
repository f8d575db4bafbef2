import { describe, expect, it } from 'vitest';
import { CancelledError } from '@/lib/base/cancel';
import { sharedWork } from '@/lib/server/planning/shared-work';

const never = new AbortController().signal;

function pending<V>() {
  const { promise, resolve, reject } = deferred<V>();
  const signals: AbortSignal[] = [];
  const work = (signal: AbortSignal) => {
    signals.push(signal);
    return promise;
  };
  return { work, resolve, reject, signals };
}

function deferred<V>() {
  let resolve!: (value: V) => void;
  let reject!: (reason: Error) => void;
  const promise = new Promise<V>((yes, no) => {
    resolve = yes;
    reject = no;
  });
  return { promise, resolve, reject };
}

describe('shared work', () => {
  it('runs once for all who want the same at the same time, and keeps the result', async () => {
    const shared = sharedWork<string>(100, (text) => text.length);
    const { work, resolve, signals } = pending<string>();
    const both = Promise.all([shared.get('a', never, work), shared.get('a', never, work)]);
    resolve('done');
    expect(await both).toEqual(['done', 'done']);
    expect(await shared.get('a', never, work)).toBe('done');
    expect(signals).toHaveLength(1);
  });

  it('goes on while somebody still waits, and is cancelled when the last has gone', async () => {
    const shared = sharedWork<string>(100, () => 1);
    const { work, signals } = pending<string>();
    const [first, second] = [new AbortController(), new AbortController()];
    const results = [shared.get('a', first.signal, work), shared.get('a', second.signal, work)];
    const settled = Promise.allSettled(results);
    first.abort();
    await expect(results[0]).rejects.toThrow(CancelledError);
    expect(signals[0]?.aborted).toBe(false);
    second.abort();
    await settled;
    expect(signals[0]?.aborted).toBe(true);
  });

  it('starts anew for who comes after a cancelled run', async () => {
    const shared = sharedWork<string>(100, () => 1);
    const abandoned = pending<string>();
    const leaving = new AbortController();
    const left = shared.get('a', leaving.signal, abandoned.work);
    leaving.abort();
    await expect(left).rejects.toThrow(CancelledError);
    const fresh = pending<string>();
    const wanted = shared.get('a', never, fresh.work);
    abandoned.reject(new CancelledError());
    fresh.resolve('fresh');
    expect(await wanted).toBe('fresh');
  });

  it('does not keep failures', async () => {
    const shared = sharedWork<string>(100, () => 1);
    await expect(shared.get('a', never, async () => Promise.reject(new Error('no')))).rejects.toThrow('no');
    expect(await shared.get('a', never, async () => 'yes')).toBe('yes');
  });

  it('gives up the least used when there is no room', async () => {
    const shared = sharedWork<string>(2, () => 1);
    let runs = 0;
    const get = (key: string) => shared.get(key, never, async () => `${key}${++runs}`);
    await get('a');
    await get('b');
    await get('a'); // used again, so b is now the oldest
    await get('c');
    expect(await get('a')).toBe('a1');
    expect(await get('b')).toBe('b4');
  });
});
