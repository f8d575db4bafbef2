import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import type { Problem } from '@/lib/report/problem';
import type { Report } from '@/lib/report/report';

/** A program as it is downloaded: UTF-8 bytes. */
export interface ProgramText {
  readonly file: string;
  readonly bytes: Uint8Array;
}

export interface PlannedJob {
  readonly report: Report;
  readonly programs: readonly ProgramText[];
}

/** What the planning thread can be asked for, and what it gives. */
export interface PlanningTasks {
  plan: { readonly ask: { readonly job: Job }; readonly give: PlannedJob };
  picture: { readonly ask: { readonly job: Job; readonly face: Face }; readonly give: string };
}
export type TaskKind = keyof PlanningTasks;

export interface TaskMessage<K extends TaskKind = TaskKind> {
  readonly kind: K;
  readonly ask: PlanningTasks[K]['ask'];
  /** One 32-bit cell that becomes 1 when nobody wants the result any more. */
  readonly cancel: SharedArrayBuffer;
}

export type TaskReply =
  | { readonly outcome: 'done'; readonly give: PlanningTasks[TaskKind]['give'] }
  | { readonly outcome: 'problems'; readonly problems: readonly Problem[] }
  | { readonly outcome: 'cancelled' }
  | { readonly outcome: 'failed'; readonly reason: string };

/** What the thread is told when it starts. */
export interface ThreadData {
  /** Folder of the shipped fonts. */
  readonly fontFolder: string;
}
