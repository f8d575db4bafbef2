import { z } from 'zod';
import { jobSchema } from '@/lib/job/job-schema';
import { moment, person } from './moment';

/** The job document with what the server knows of it. The answer carries `ETag: "<version>"`. */
export const savedJob = z.object({
  job: jobSchema,
  version: z.int(),
  /** SHA-256 of the canonical document. */
  hash: z.string(),
  savedAt: moment,
  savedBy: person.nullable(),
});
export type SavedJob = z.infer<typeof savedJob>;

/**
 * The answer to a save: given only after the database has committed. The document itself is not echoed; the client
 * holds it.
 */
export const jobSaved = savedJob.omit({ job: true });
export type JobSaved = z.infer<typeof jobSaved>;

/** The entity tag of a version of a job document, for ETag and If-Match. */
export function jobEtag(version: number): string {
  return `"${version}"`;
}

/** The version that an If-Match or If-None-Match header names, or null when it names none. */
export function versionOfEtag(header: string): number | null {
  const match = /^\s*(?:W\/)?"(\d{1,15})"\s*$/.exec(header);
  return match ? Number(match[1]) : null;
}
