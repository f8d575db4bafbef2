import { z } from 'zod';
import { jobSchema } from '@/lib/job/job-schema';
import { moment, person } from './moment';

/** A fixed copy of the job document, numbered from 1 within its project. */
export const revisionItem = z.object({
  number: z.int(),
  note: z.string(),
  jobHash: z.string(),
  author: person,
  createdAt: moment,
});
export type RevisionItem = z.infer<typeof revisionItem>;

/** Newest first. */
export const revisionList = z.object({ items: z.array(revisionItem) });
export type RevisionList = z.infer<typeof revisionList>;

export const revision = revisionItem.extend({ job: jobSchema });
export type Revision = z.infer<typeof revision>;

export const createRevisionBody = z.strictObject({ note: z.string().trim().max(2000).default('') });
export type CreateRevisionBody = z.input<typeof createRevisionBody>;
