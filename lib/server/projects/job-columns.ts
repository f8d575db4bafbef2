import { createHash } from 'node:crypto';
import { canonicalJob } from '@/lib/job/canonical';
import type { Job } from '@/lib/job/job-schema';

/** The columns of a project that come from its job document; written together, so that they cannot disagree. */
export function jobColumns(job: Job) {
  return {
    job,
    // The same as the core's `jobHash`, which may not use Node's faster digest.
    jobHash: createHash('sha256').update(canonicalJob(job)).digest('hex'),
    name: job.name,
    boardX: job.board.x,
    boardY: job.board.y,
    boardZ: job.board.z,
    material: job.board.material,
  };
}
