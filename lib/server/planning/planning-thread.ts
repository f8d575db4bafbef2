import 'server-only';
import path from 'node:path';
import { Worker } from 'node:worker_threads';
import { CancelledError } from '@/lib/base/cancel';
import { ApiError } from '../http/api-error';
import { invalid } from '../http/check-input';
import type { PlanningTasks, TaskKind, TaskMessage, TaskReply, ThreadData } from './planning-task';

/** A plan that takes longer is stopped, seconds. */
const LONGEST_SECONDS = 120;

/** How long cancelled work may take to notice before its thread is ended, ms. */
const CANCEL_GRACE = 2_000;

export interface PlanningThread {
  /**
   * Runs one task after those asked for before. Rejects with an {@link ApiError} where the document cannot be planned
   * or it takes too long, with {@link CancelledError} when `signal` gave up.
   */
  run<K extends TaskKind>(
    kind: K,
    ask: PlanningTasks[K]['ask'],
    signal: AbortSignal,
  ): Promise<PlanningTasks[K]['give']>;
}

/**
 * A thread for work that would hold up every request if it ran here. It starts with its first task, does one at a time,
 * and is ended and started anew when a task does not come back. `start` makes the thread; the bundler compiles the one
 * that stands below.
 */
export function planningThread(longestSeconds = LONGEST_SECONDS, start = startWorker): PlanningThread {
  let worker: Worker | null = null;
  let last: Promise<unknown> = Promise.resolve();

  function open(): Worker {
    const data: ThreadData = { fontFolder: path.join(process.cwd(), 'public', 'fonts') };
    const opened = start(data);
    // An error also ends the thread; whoever waits for it hears of it there.
    opened.on('error', () => undefined);
    opened.once('exit', () => (worker = null));
    opened.unref();
    return opened;
  }

  function run<K extends TaskKind>(kind: K, ask: PlanningTasks[K]['ask'], signal: AbortSignal) {
    const result = last.then(() => {
      if (signal.aborted) throw new CancelledError();
      worker ??= open();
      return runOn(worker, kind, ask, signal, longestSeconds);
    });
    last = result.catch(() => undefined);
    return result;
  }
  return { run };
}

/** Written out like this, address and options in one call, or the bundler does not see that it is a thread to compile. */
function startWorker(data: ThreadData): Worker {
  return new Worker(new URL('./planning.worker.ts', import.meta.url), { workerData: data });
}

async function runOn<K extends TaskKind>(
  worker: Worker,
  kind: K,
  ask: PlanningTasks[K]['ask'],
  signal: AbortSignal,
  longestSeconds: number,
): Promise<PlanningTasks[K]['give']> {
  const cancel = new SharedArrayBuffer(4);
  const message: TaskMessage<K> = { kind, ask, cancel };
  const reply = await replyTo(worker, message, signal, longestSeconds);
  switch (reply.outcome) {
    case 'done':
      return reply.give as PlanningTasks[K]['give'];
    case 'problems':
      throw invalid(reply.problems);
    case 'cancelled':
      throw new CancelledError();
    case 'failed':
      throw new Error(`The planning thread failed: ${reply.reason}`);
  }
}

function replyTo(
  worker: Worker,
  message: TaskMessage,
  signal: AbortSignal,
  longestSeconds: number,
): Promise<TaskReply> {
  return new Promise<TaskReply>((resolve, reject) => {
    const timers: NodeJS.Timeout[] = [];
    const settle = () => {
      timers.forEach(clearTimeout);
      signal.removeEventListener('abort', onAbort);
      worker.off('message', onReply).off('error', lose).off('exit', onExit);
      worker.unref();
    };
    const onReply = (reply: TaskReply) => {
      settle();
      resolve(reply);
    };
    const lose = (cause: Error) => {
      settle();
      // The next task must find it gone, so the failure is told only once it is.
      void worker.terminate().then(() => reject(cause));
    };
    const onExit = (code: number) => lose(new Error(`The planning thread ended with code ${code}.`));
    const onAbort = () => {
      Atomics.store(new Int32Array(message.cancel), 0, 1);
      timers.push(setTimeout(() => lose(new CancelledError()), CANCEL_GRACE));
    };
    const tooLong = () =>
      new ApiError('planning-timeout', `Planning took more than ${longestSeconds} seconds and was stopped.`);

    worker.ref();
    worker.once('message', onReply);
    worker.once('error', lose);
    worker.once('exit', onExit);
    timers.push(setTimeout(() => lose(tooLong()), longestSeconds * 1000));
    signal.addEventListener('abort', onAbort, { once: true });
    worker.postMessage(message);
  });
}
