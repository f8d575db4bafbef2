import { type MessagePort, parentPort, workerData } from 'node:worker_threads';
import { CancelledError, type WorkControl } from '@/lib/base/cancel';
import { fail, ok, type Result } from '@/lib/base/result';
import type { FontBook } from '@/lib/outline/fonts';
import { resolveOutlines } from '@/lib/outline/resolve-outlines';
import { planJob } from '@/lib/pipeline/plan-job';
import type { Problem } from '@/lib/report/problem';
import { facePicture } from './face-picture';
import type {
  PlannedJob,
  PlanningTasks,
  TaskKind,
  TaskMessage,
  TaskReply,
  ThreadData,
} from './planning-task';
import { readFonts } from './read-fonts';

type Run<K extends TaskKind> = (
  ask: PlanningTasks[K]['ask'],
  fonts: FontBook,
  control: WorkControl,
) => Result<PlanningTasks[K]['give'], readonly Problem[]>;

const RUNS: { readonly [K in TaskKind]: Run<K> } = { plan, picture };

function plan({ job }: PlanningTasks['plan']['ask'], fonts: FontBook, control: WorkControl) {
  const planned = planJob(job, fonts, control);
  if (!planned.ok) return planned;
  const { report, programs } = planned.value;
  const encoder = new TextEncoder();
  const given: PlannedJob = {
    report,
    programs: programs.map(({ file, text }) => ({ file, bytes: encoder.encode(text) })),
  };
  return ok(given);
}

/** A picture is drawn even of a document with problems: then it shows the board alone. */
function picture({ job, face }: PlanningTasks['picture']['ask'], fonts: FontBook) {
  const outlines = resolveOutlines(job, fonts);
  return ok(facePicture(job, outlines.ok ? outlines.value : null, face));
}

function answer<K extends TaskKind>(message: TaskMessage<K>, fonts: FontBook): TaskReply {
  const cancel = new Int32Array(message.cancel);
  const control: WorkControl = { isCancelled: () => Atomics.load(cancel, 0) === 1 };
  try {
    const result = control.isCancelled?.() ? fail([]) : RUNS[message.kind](message.ask, fonts, control);
    if (control.isCancelled?.()) return { outcome: 'cancelled' };
    return result.ok
      ? { outcome: 'done', give: result.value }
      : { outcome: 'problems', problems: result.error };
  } catch (error) {
    if (error instanceof CancelledError) return { outcome: 'cancelled' };
    return {
      outcome: 'failed',
      reason: error instanceof Error ? (error.stack ?? error.message) : String(error),
    };
  }
}

function listen(port: MessagePort, { fontFolder }: ThreadData): void {
  const fonts = readFonts(fontFolder);
  port.on('message', (message: TaskMessage) => port.postMessage(answer(message, fonts)));
}

if (parentPort) listen(parentPort, workerData as ThreadData);
