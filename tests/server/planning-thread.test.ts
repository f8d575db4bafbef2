import { Worker } from 'node:worker_threads';
import { describe, expect, it } from 'vitest';
import { CancelledError } from '@/lib/base/cancel';
import { parseJob } from '@/lib/job/parse-job';
import type { Job } from '@/lib/job/job-schema';
import * as planning from '@/lib/server/planning/planning-thread';
import type { ThreadData } from '@/lib/server/planning/planning-task';
import { sampleJob, withValue } from '../helpers/sample-job';

/** The thread from its source, which Node cannot run without the loader; a build has it compiled. */
function startFromSource(data: ThreadData): Worker {
  const source = new URL('../../lib/server/planning/planning.worker.ts', import.meta.url).href;
  const code = `import('tsx/esm/api').then(({ register }) => (register(), import(${JSON.stringify(source)})));`;
  return new Worker(code, { workerData: data, eval: true });
}

function planningThread(longestSeconds?: number) {
  return planning.planningThread(longestSeconds, startFromSource);
}

const never = new AbortController().signal;

function job(change?: [path: string, to: unknown]): Job {
  const parsed = parseJob(change ? withValue(sampleJob(), ...change) : sampleJob());
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.error));
  return parsed.value;
}

describe('the planning thread', () => {
  it('plans to the same bytes each time, and draws', { timeout: 60_000 }, async () => {
    const thread = planningThread();
    const first = await thread.run('plan', { job: job() }, never);
    const again = await thread.run('plan', { job: job() }, never);
    expect(first.programs.map(({ file }) => file)).toEqual(first.report.programs.map(({ file }) => file));
    expect(first.programs.length).toBeGreaterThan(1);
    expect(again).toEqual(first);
    const picture = await thread.run('picture', { job: job(), face: 'B' }, never);
    expect(picture).toMatch(/^<svg .*<\/svg>$/);
  });

  it('tells the place of what cannot be planned, and goes on', { timeout: 60_000 }, async () => {
    const thread = planningThread();
    const broken = job(['outlines.1.shape', { type: 'path', d: 'M0 0 L10' }]);
    await expect(thread.run('plan', { job: broken }, never)).rejects.toMatchObject({
      code: 'invalid',
      extra: { problems: [{ path: 'outlines[1].shape.d' }] },
    });
    await expect(thread.run('picture', { job: broken, face: 'A' }, never)).resolves.toContain('<svg');
  });

  it('is stopped when it takes too long, and starts anew', { timeout: 60_000 }, async () => {
    const hurried = planningThread(0.001);
    await expect(hurried.run('plan', { job: job() }, never)).rejects.toMatchObject({
      code: 'planning-timeout',
    });
    await expect(hurried.run('plan', { job: job() }, never)).rejects.toMatchObject({
      code: 'planning-timeout',
    });
  });

  it('stops for a caller who has gone and serves the next one', { timeout: 60_000 }, async () => {
    const thread = planningThread();
    const leaving = new AbortController();
    const given = thread.run('plan', { job: job() }, leaving.signal);
    leaving.abort();
    await expect(given).rejects.toThrow(CancelledError);
    await expect(thread.run('picture', { job: job(), face: 'A' }, never)).resolves.toContain('<svg');
  });
});
