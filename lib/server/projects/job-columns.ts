import { jobHash } from '@/lib/job/canonical';
import type { Job } from '@/lib/job/job-schema';

/** The columns of a project that come from its job document; written together, so that they cannot disagree. */
export function jobColumns(job: Job) {
  return {
    job,
    jobHash: jobHash(job),
    name: job.name,
    boardX: job.board.x,
    boardY: job.board.y,
    boardZ: job.board.z,
    material: job.board.material,
  };
}
