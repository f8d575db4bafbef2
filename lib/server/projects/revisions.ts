import 'server-only';
import { randomUUID } from 'node:crypto';
import { type EntityManager, LockMode } from '@mikro-orm/postgresql';
import type { Revision as RevisionAnswer, RevisionItem, RevisionList } from '@/lib/contracts/revision';
import { Project } from '@/entities/project.entity';
import { Revision } from '@/entities/revision.entity';
import type { ProjectAccess } from '../access/project-access';
import { notFound } from '../http/api-error';
import { personOf } from './project-answer';

export async function listRevisions(em: EntityManager, { projectId }: ProjectAccess): Promise<RevisionList> {
  const revisions = await em.find(
    Revision,
    { project: projectId },
    { populate: ['author'], orderBy: { number: 'desc' } },
  );
  return { items: revisions.map(revisionItem) };
}

export async function readRevision(
  em: EntityManager,
  { projectId }: ProjectAccess,
  number: number,
): Promise<RevisionAnswer> {
  const revision = await em.findOne(
    Revision,
    { project: projectId, number },
    { populate: ['author', 'job'] },
  );
  if (!revision?.job) throw notFound('The revision');
  return { ...revisionItem(revision), job: revision.job };
}

/** Fixes the document as it is saved now. The project's row is locked, so numbers have no gaps and no doubles. */
export async function createRevision(
  em: EntityManager,
  { projectId, principal }: ProjectAccess,
  note: string,
): Promise<RevisionItem> {
  return em.transactional(async (tx) => {
    const project = await tx.findOne(
      Project,
      { id: projectId, deletedAt: null },
      { populate: ['job'], lockMode: LockMode.PESSIMISTIC_WRITE },
    );
    if (!project?.job) throw notFound('The project');
    const newest = await tx.findOne(
      Revision,
      { project: projectId },
      { fields: ['number'], orderBy: { number: 'desc' } },
    );
    const number = (newest?.number ?? 0) + 1;
    const createdAt = new Date();
    const { job, jobHash } = project;
    await tx.insert(Revision, {
      id: randomUUID(),
      project: projectId,
      number,
      note,
      job,
      jobHash,
      author: principal.userId,
      createdAt,
    });
    const author = { id: principal.userId, name: principal.name };
    return { number, note, jobHash, author, createdAt: createdAt.toISOString() };
  });
}

function revisionItem(revision: Revision): RevisionItem {
  return {
    number: revision.number,
    note: revision.note,
    jobHash: revision.jobHash,
    author: personOf(revision.author.getEntity()),
    createdAt: revision.createdAt.toISOString(),
  };
}
