import { fail, ok, type Result } from '@/lib/base/result';
import type { Cut } from '@/lib/job/cut-schema';
import type { Job } from '@/lib/job/job-schema';
import { parseJob } from '@/lib/job/parse-job';
import { withoutLostRest } from './edit-outlines';
import { newId, newName } from './new-id';

/** Replaces the cut of the same id. Fails with a sentence where the document would no longer be right. */
export function replaceCut(job: Job, cut: Cut): Result<Job, string> {
  const index = job.cuts.findIndex(({ id }) => id === cut.id);
  return checkedJob(
    { ...job, cuts: job.cuts.map((other, i) => (i === index ? cut : other)) },
    `cuts[${index}].`,
  );
}

/** The job if it is right, or what is not, without the part of the path that the form already shows. */
export function checkedJob(job: Job, within = ''): Result<Job, string> {
  const parsed = parseJob(job);
  if (parsed.ok) return ok(job);
  const [problem] = parsed.error;
  if (!problem) return ok(job);
  const { path, message } = problem;
  return fail(`${path.startsWith(within) ? path.slice(within.length) : path} ${message}`);
}

/** Takes a cut out; pockets that cleared its leavings stand on their own. */
export function deleteCut(job: Job, id: string): Job {
  return { ...job, cuts: withoutLostRest(job.cuts.filter((cut) => cut.id !== id)) };
}

/** A copy right behind its original, and its id. */
export function duplicateCut(job: Job, id: string): { job: Job; id: string } | null {
  const index = job.cuts.findIndex((cut) => cut.id === id);
  const original = job.cuts[index];
  if (!original) return null;
  const copy: Cut = {
    ...original,
    id: newId(
      original.kind,
      job.cuts.map((cut) => cut.id),
    ),
    name: newName(
      original.name,
      job.cuts.map((cut) => cut.name),
    ),
  };
  return {
    job: { ...job, cuts: [...job.cuts.slice(0, index + 1), copy, ...job.cuts.slice(index + 1)] },
    id: copy.id,
  };
}

/** Moves a cut by `by` places among the cuts of its own face; what is done on the other face stays where it is. */
export function moveCut(job: Job, id: string, by: number): Job {
  const index = job.cuts.findIndex((cut) => cut.id === id);
  const cut = job.cuts[index];
  if (!cut) return job;
  const places = job.cuts.flatMap(({ face }, i) => (face === cut.face ? [i] : []));
  const from = places.indexOf(index);
  const to = Math.min(Math.max(from + by, 0), places.length - 1);
  if (from === to) return job;
  const order = places.map((place) => job.cuts[place]!);
  order.splice(to, 0, ...order.splice(from, 1));
  const cuts = [...job.cuts];
  places.forEach((place, i) => (cuts[place] = order[i]!));
  return { ...job, cuts };
}

/**
 * Sets one field of a cut, given by its key (`depth`, or `tabs.hold` for one within); undefined takes it out, so that
 * its default holds again. Fails with a sentence where the document would no longer be right.
 */
export function setCutField(job: Job, id: string, key: string, value: unknown): Result<Job, string> {
  const cut = job.cuts.find((other) => other.id === id);
  if (!cut) return fail(`There is no cut '${id}' any more.`);
  // What was put together from a key is a cut again once the document has been checked.
  return replaceCut(job, withField(cut, key.split('.'), value) as Cut);
}

function withField(object: object, [key, ...rest]: readonly string[], value: unknown): object {
  if (key === undefined) return object;
  const inner: unknown = Reflect.get(object, key);
  const next =
    rest.length > 0 ? withField(typeof inner === 'object' && inner ? inner : {}, rest, value) : value;
  if (next !== undefined) return { ...object, [key]: next };
  return Object.fromEntries(Object.entries(object).filter(([other]) => other !== key));
}
