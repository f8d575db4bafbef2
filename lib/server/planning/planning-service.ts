import 'server-only';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import { planningThread } from './planning-thread';
import type { PlannedJob } from './planning-task';
import { type SharedWork, sharedWork } from './shared-work';

const MEGABYTE = 1024 * 1024;

interface PlanningService {
  plan(job: Job, hash: string, signal: AbortSignal): Promise<PlannedJob>;
  picture(job: Job, hash: string, face: Face, signal: AbortSignal): Promise<string>;
}

declare global {
  // Next loads this module more than once; threads and kept plans must be one set.
  var spindleafPlanning: PlanningService | undefined;
}

/**
 * Plans and pictures by the document's hash: the same hash always gives the same bytes, so they are kept. Pictures have
 * a thread of their own, or a list of projects would wait for a long plan.
 */
export function planningService(): PlanningService {
  return (globalThis.spindleafPlanning ??= startService());
}

function startService(): PlanningService {
  const planThread = planningThread();
  const pictureThread = planningThread();
  const plans: SharedWork<PlannedJob> = sharedWork(128 * MEGABYTE, planSize);
  const pictures: SharedWork<string> = sharedWork(16 * MEGABYTE, (svg) => svg.length);
  return {
    plan: (job, hash, signal) => plans.get(hash, signal, (stop) => planThread.run('plan', { job }, stop)),
    picture: (job, hash, face, signal) =>
      pictures.get(`${hash}.${face}`, signal, (stop) => pictureThread.run('picture', { job, face }, stop)),
  };
}

/** The texts, and a guess at the report's objects. */
function planSize({ programs, report }: PlannedJob): number {
  const texts = programs.reduce((sum, { bytes }) => sum + bytes.byteLength, 0);
  return texts + 500 * (report.findings.length + report.cuts.length + report.programs.length);
}
