import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { CommentReply, CommentThread, CommentThreads } from '@/lib/contracts/comment';
import { Comment } from '@/entities/comment.entity';
import type { ProjectAccess } from '../access/project-access';
import { notFound } from '../http/api-error';
import { personOf } from '../projects/project-answer';

/** Every thread of the project with its replies, both oldest first; one query. */
export async function listComments(em: EntityManager, access: ProjectAccess): Promise<CommentThreads> {
  return { items: await readThreads(em, access, {}) };
}

/** The thread that `threadId` begins. */
export async function readThread(
  em: EntityManager,
  access: ProjectAccess,
  threadId: string,
): Promise<CommentThread> {
  const [thread] = await readThreads(em, access, { $or: [{ id: threadId }, { thread: threadId }] });
  if (!thread) throw notFound('The comment');
  return thread;
}

async function readThreads(
  em: EntityManager,
  access: ProjectAccess,
  which: object,
): Promise<CommentThread[]> {
  const comments = await em
    .fork()
    .find(
      Comment,
      { project: access.projectId, deletedAt: null, ...which },
      { populate: ['author', 'resolvedBy'], orderBy: { createdAt: 'asc', id: 'asc' } },
    );
  const replies = new Map<string, Comment[]>();
  for (const comment of comments) {
    if (!comment.thread) continue;
    const before = replies.get(comment.thread.id);
    if (before) before.push(comment);
    else replies.set(comment.thread.id, [comment]);
  }
  return comments.flatMap((comment) =>
    comment.pin ? [threadAnswer(comment, comment.pin, replies.get(comment.id) ?? [], access)] : [],
  );
}

function threadAnswer(
  comment: Comment,
  pin: NonNullable<Comment['pin']>,
  replies: readonly Comment[],
  access: ProjectAccess,
): CommentThread {
  return {
    ...replyAnswer(comment, access),
    pin,
    version: comment.jobVersion,
    resolvedAt: comment.resolvedAt?.toISOString() ?? null,
    resolvedBy: comment.resolvedBy ? personOf(comment.resolvedBy.getEntity()) : null,
    replies: replies.map((reply) => replyAnswer(reply, access)),
  };
}

function replyAnswer(comment: Comment, { principal }: ProjectAccess): CommentReply {
  const author = comment.author.getEntity();
  return {
    id: comment.id,
    author: personOf(author),
    text: comment.text,
    createdAt: comment.createdAt.toISOString(),
    editedAt: comment.editedAt?.toISOString() ?? null,
    mine: author.id === principal.userId,
  };
}
