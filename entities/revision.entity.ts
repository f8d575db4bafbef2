import { defineEntity, type InferEntity, p } from '@mikro-orm/core';
import type { Job } from '@/lib/job/job-schema';
import { Project } from './project.entity';
import { User } from './user.entity';

/** A fixed copy of a job document; never changed once written. */
export const Revision = defineEntity({
  name: 'Revision',
  tableName: 'revisions',
  uniques: [{ name: 'revisions_number_unique', properties: ['project', 'number'] }],
  properties: {
    id: p.uuid().primary(),
    project: () => p.manyToOne(Project).ref().deleteRule('cascade'),
    /** From 1 within its project. */
    number: p.integer(),
    note: p.text(),
    job: p.json<Job>().lazy(true, false),
    jobHash: p.string().length(64),
    author: () => p.manyToOne(User).ref(),
    createdAt: p.datetime(3),
  },
});
export type Revision = InferEntity<typeof Revision>;
