import { z } from 'zod';
import { coordinate, face, id as jobId } from '@/lib/job/numbers';
import { moment, person, recordId } from './moment';

/** Where a comment is pinned: a spot on a face, in that face's view in mm, or a cut of the job document. */
export const commentPin = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('spot'), face, x: coordinate, y: coordinate }),
  z.strictObject({ kind: z.literal('cut'), cut: jobId }),
]);
export type CommentPin = z.infer<typeof commentPin>;

const text = z.string().trim().min(1, 'must not be empty').max(4000, 'must have at most 4000 characters');

export const commentReply = z.object({
  id: recordId,
  author: person,
  text: z.string(),
  createdAt: moment,
  editedAt: moment.nullable(),
  /** Whether the asking person wrote it and so may edit or delete it. */
  mine: z.boolean(),
});
export type CommentReply = z.infer<typeof commentReply>;

/** A comment with its replies, oldest reply first. */
export const commentThread = commentReply.extend({
  pin: commentPin,
  /** The job document's version when it was written. */
  version: z.int(),
  resolvedAt: moment.nullable(),
  resolvedBy: person.nullable(),
  replies: z.array(commentReply),
});
export type CommentThread = z.infer<typeof commentThread>;

/** Oldest first, resolved ones included. */
export const commentThreads = z.object({ items: z.array(commentThread) });
export type CommentThreads = z.infer<typeof commentThreads>;

export const createCommentBody = z.strictObject({ pin: commentPin, text });
export type CreateCommentBody = z.infer<typeof createCommentBody>;

export const createReplyBody = z.strictObject({ text });
export type CreateReplyBody = z.infer<typeof createReplyBody>;

/** `text` by its author; `resolved` by editors, the owner and the thread's author. */
export const changeCommentBody = z
  .strictObject({ text: text.optional(), resolved: z.boolean().optional() })
  .refine((body) => body.text !== undefined || body.resolved !== undefined, 'must change something');
export type ChangeCommentBody = z.infer<typeof changeCommentBody>;
