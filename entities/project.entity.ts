import { defineEntity, type InferEntity, p } from '@mikro-orm/core';
import { PROJECT_STATES } from '@/lib/contracts/project';
import type { Job } from '@/lib/job/job-schema';
import { Shop } from './shop.entity';
import { User } from './user.entity';

/**
 * A job document with its people. Name, board and material repeat what the document says, so that lists need not read
 * it; they are written with it, in one statement.
 */
export const Project = defineEntity({
  name: 'Project',
  tableName: 'projects',
  indexes: [
    {
      name: 'projects_newest_index',
      expression:
        'create index projects_newest_index on projects (updated_at desc, id desc) where deleted_at is null',
    },
  ],
  properties: {
    id: p.uuid().primary(),
    name: p.string().length(200),
    state: p.enum([...PROJECT_STATES]).default('draft'),
    owner: () => p.manyToOne(User).ref(),
    shop: () => p.manyToOne(Shop).ref().nullable().deleteRule('set null'),
    job: p.json<Job>().lazy(true, false),
    /** Counts saves of the document; a save names the version it was made from. */
    version: p.integer(),
    jobHash: p.string().length(64),
    boardX: p.double().$type<number>(),
    boardY: p.double().$type<number>(),
    boardZ: p.double().$type<number>(),
    material: p.string().length(80),
    savedAt: p.datetime(3),
    savedBy: () => p.manyToOne(User).ref().nullable().deleteRule('set null'),
    createdAt: p.datetime(3),
    updatedAt: p.datetime(3),
    deletedAt: p.datetime(3).nullable(),
  },
});
export type Project = InferEntity<typeof Project>;
