import { defineEntity, type EntitySchema, type InferEntity, p } from '@mikro-orm/core';
import type { CommentPin } from '@/lib/contracts/comment';
import { Project } from './project.entity';
import { User } from './user.entity';

/** A comment pinned to a spot or a cut, or a reply to one (then `thread` is set and `pin` is not). */
export const Comment = defineEntity({
  name: 'Comment',
  tableName: 'comments',
  indexes: [
    { name: 'comments_project_index', properties: ['project', 'createdAt'] },
    { name: 'comments_thread_index', properties: ['thread'] },
    {
      name: 'comments_open_index',
      expression:
        'create index comments_open_index on comments (project_id) where thread_id is null and resolved_at is null and deleted_at is null',
    },
  ],
  checks: [
    { name: 'comments_pin_check', expression: '(pin is null) = (thread_id is not null)' },
    { name: 'comments_resolved_check', expression: 'resolved_at is null or thread_id is null' },
  ],
  properties: {
    id: p.uuid().primary(),
    project: () => p.manyToOne(Project).ref().deleteRule('cascade'),
    // The assertion spares the compiler inferring the entity's type from itself.
    thread: () =>
      p
        .manyToOne(Comment as unknown as EntitySchema<{ id: string }>)
        .ref()
        .nullable()
        .deleteRule('cascade'),
    author: () => p.manyToOne(User).ref(),
    text: p.text(),
    pin: p.json<CommentPin>().nullable(),
    /** The job document's version when it was written. */
    jobVersion: p.integer(),
    createdAt: p.datetime(3),
    editedAt: p.datetime(3).nullable(),
    resolvedAt: p.datetime(3).nullable(),
    resolvedBy: () => p.manyToOne(User).ref().nullable().deleteRule('set null'),
    deletedAt: p.datetime(3).nullable(),
  },
});
export type Comment = InferEntity<typeof Comment>;
