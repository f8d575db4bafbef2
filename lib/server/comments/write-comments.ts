import 'server-only';
import { randomUUID } from 'node:crypto';
import { type EntityManager, LockMode } from '@mikro-orm/postgresql';
import type {
  ChangeCommentBody,
  CommentReply,
  CommentThread,
  CreateCommentBody,
} from '@/lib/contracts/comment';
import { mayInProject } from '@/lib/contracts/roles';
import { Comment } from '@/entities/comment.entity';
import { Project } from '@/entities/project.entity';
import type { ProjectAccess } from '../access/project-access';
import { ApiError, notFound } from '../http/api-error';
import { readThread } from './list-comments';

export async function createComment(
  em: EntityManager,
  access: ProjectAccess,
  { pin, text }: CreateCommentBody,
): Promise<CommentThread> {
  const id = await insertComment(em, access, { pin, text, thread: null });
  return readThread(em, access, id);
}

/** Replies to the thread that `threadId` begins; replies have no replies of their own. */
export async function createReply(
  em: EntityManager,
  access: ProjectAccess,
  threadId: string,
  text: string,
): Promise<CommentReply> {
  const id = await em.transactional(async (tx) => {
    const thread = await tx.findOne(
      Comment,
      { id: threadId, project: access.projectId, thread: null, deletedAt: null },
      // Deleting the thread waits for the reply, or the reply finds it gone: never a reply without its thread.
      { lockMode: LockMode.PESSIMISTIC_READ },
    );
    if (!thread) throw notFound('The comment');
    return insertComment(tx, access, { pin: null, text, thread: threadId });
  });
  const { replies } = await readThread(em, access, threadId);
  const reply = replies.find((one) => one.id === id);
  if (!reply) throw notFound('The comment');
  return reply;
}

/** Edits one's own text; resolves or reopens a thread, as editor, owner or the thread's author. */
export async function changeComment(
  em: EntityManager,
  access: ProjectAccess,
  commentId: string,
  { text, resolved }: ChangeCommentBody,
): Promise<CommentThread> {
  const comment = await findComment(em, access, commentId);
  const mine = comment.author.id === access.principal.userId;
  const now = new Date();
  const changes: Partial<{
    text: string;
    editedAt: Date;
    resolvedAt: Date | null;
    resolvedBy: string | null;
  }> = {};
  if (text !== undefined) {
    if (!mine) throw new ApiError('forbidden', 'Only its author can edit a comment.');
    Object.assign(changes, { text, editedAt: now });
  }
  if (resolved !== undefined) {
    if (comment.thread) throw new ApiError('conflict', 'A reply cannot be resolved; its thread can.');
    if (!mine && !mayInProject(access.role, 'project.edit')) {
      throw new ApiError('forbidden', 'Editors and the comment’s author can resolve it.');
    }
    Object.assign(changes, {
      resolvedAt: resolved ? now : null,
      resolvedBy: resolved ? access.principal.userId : null,
    });
  }
  await em.nativeUpdate(Comment, { id: commentId, deletedAt: null }, changes);
  return readThread(em, access, comment.thread?.id ?? commentId);
}

/** Deletes one's own comment softly; a thread takes its replies along. */
export async function deleteComment(
  em: EntityManager,
  access: ProjectAccess,
  commentId: string,
): Promise<void> {
  const comment = await findComment(em, access, commentId);
  if (comment.author.id !== access.principal.userId) {
    throw new ApiError('forbidden', 'Only its author can delete a comment.');
  }
  await em.nativeUpdate(
    Comment,
    { project: access.projectId, deletedAt: null, $or: [{ id: commentId }, { thread: commentId }] },
    { deletedAt: new Date() },
  );
}

async function findComment(em: EntityManager, { projectId }: ProjectAccess, id: string): Promise<Comment> {
  const comment = await em.findOne(Comment, { id, project: projectId, deletedAt: null });
  if (!comment) throw notFound('The comment');
  return comment;
}

async function insertComment(
  em: EntityManager,
  { projectId, principal }: ProjectAccess,
  what: { pin: Comment['pin'] | null; text: string; thread: string | null },
): Promise<string> {
  const project = await em.findOne(Project, { id: projectId, deletedAt: null }, { fields: ['version'] });
  if (!project) throw notFound('The project');
  const id = randomUUID();
  await em.insert(Comment, {
    id,
    project: projectId,
    author: principal.userId,
    jobVersion: project.version,
    createdAt: new Date(),
    ...what,
  });
  return id;
}
