import { afterEach, describe, expect, it, vi } from 'vitest';
import { createShutdown } from '@/scripts/setup/shutdown.mjs';

afterEach(() => vi.restoreAllMocks());

describe('stopping what was started', () => {
  it('goes backwards, one after another, and only once', async () => {
    const shutdown = createShutdown();
    const order: string[] = [];
    shutdown.onStop(() => order.push('database'));
    shutdown.onStop(async () => {
      await Promise.resolve();
      order.push('app');
    });
    await Promise.all([shutdown.stopAll(), shutdown.stopAll()]);
    expect(order).toEqual(['app', 'database']);
    expect(shutdown.isStopping()).toBe(true);
  });

  it('leaves out what has ended by itself, and goes on after one that fails', async () => {
    const complaint = vi.spyOn(console, 'error').mockImplementation(() => undefined);
    const shutdown = createShutdown();
    const stopped: string[] = [];
    shutdown.onStop(() => stopped.push('first'));
    shutdown.onStop(() => {
      throw new Error('stuck');
    });
    const forget = shutdown.onStop(() => stopped.push('ended'));
    forget();
    await shutdown.stopAll();
    expect(stopped).toEqual(['first']);
    expect(complaint).toHaveBeenCalledWith('While stopping: stuck');
  });
});
