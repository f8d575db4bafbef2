import type { Job, JobInput } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import { outline as outlineSchema } from '@/lib/job/shape-schema';
import { newId, newName } from './new-id';

/** The job with outlines of a file on `face`, their ids and names made unlike those that are there, and the new ids. */
export function placeImported(
  job: Job,
  face: Face,
  outlines: JobInput['outlines'],
): { job: Job; ids: string[] } {
  const taken = new Set(job.outlines.map(({ id }) => id));
  const names = new Set(job.outlines.map(({ name }) => name));
  const added = outlines.map((outline) => {
    const id = newId(outline.id, taken);
    const name = newName(outline.name ?? outline.id, names);
    taken.add(id);
    names.add(name);
    return outlineSchema.parse({ ...outline, id, name, face });
  });
  return { job: { ...job, outlines: [...job.outlines, ...added] }, ids: added.map(({ id }) => id) };
}
