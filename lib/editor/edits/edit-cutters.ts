import { fail, ok, type Result } from '@/lib/base/result';
import type { Job } from '@/lib/job/job-schema';
import type { Cutter } from '@/lib/job/machine-schema';

/** The job with a cutter more; a number that is taken already becomes the next free one. */
export function addCutter(job: Job, cutter: Cutter): Job {
  const numbers = new Set(job.cutters.map(({ number }) => number));
  let number = cutter.number;
  while (numbers.has(number)) number++;
  return { ...job, cutters: [...job.cutters, { ...cutter, number }] };
}

/** Takes a cutter out; fails with a sentence while a cut uses it. */
export function deleteCutter(job: Job, id: string): Result<Job, string> {
  const user = job.cuts.find(
    (cut) => cut.cutter === id || (cut.kind === 'taper-engrave' && cut.floor === id),
  );
  const cutter = job.cutters.find((other) => other.id === id);
  if (user)
    return fail(
      `${cutter?.name ?? id} is used by ‘${user.name || user.id}’: give that cut another cutter first.`,
    );
  return ok({ ...job, cutters: job.cutters.filter((other) => other.id !== id) });
}
