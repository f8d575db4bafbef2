import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { type JobSaved, jobEtag, type SavedJob, versionOfEtag } from '@/lib/contracts/job-document';
import { parseJob } from '@/lib/job/parse-job';
import type { Job } from '@/lib/job/job-schema';
import { Project } from '@/entities/project.entity';
import type { ProjectAccess } from '../access/project-access';
import { ApiError, notFound } from '../http/api-error';
import { invalid } from '../http/check-input';
import { jobColumns } from './job-columns';
import { personOf } from './project-answer';

/** The project's job document as it is saved now. */
export async function readJob(em: EntityManager, { projectId }: ProjectAccess): Promise<SavedJob> {
  const project = await em
    .fork()
    .findOne(Project, { id: projectId, deletedAt: null }, { populate: ['job', 'savedBy'] });
  if (!project?.job) throw notFound('The project');
  return {
    job: project.job,
    version: project.version,
    hash: project.jobHash,
    savedAt: project.savedAt.toISOString(),
    savedBy: project.savedBy ? personOf(project.savedBy.getEntity()) : null,
  };
}

/**
 * Saves `document` if the saved one is still the version that `ifMatch` names. It is checked first and compared and
 * written in one statement, so of two saves made from the same version one wins and the other is told, with what won.
 */
export async function saveJob(
  em: EntityManager,
  access: ProjectAccess,
  ifMatch: string | null,
  document: unknown,
): Promise<JobSaved> {
  if (ifMatch === null) {
    throw new ApiError('version-required', 'Say with If-Match which version the change was made from.');
  }
  const expected = versionOfEtag(ifMatch);
  if (expected === null) {
    throw new ApiError('bad-request', 'If-Match must hold the ETag of one version, as in "12".');
  }
  const parsed = parseJob(document);
  if (!parsed.ok) throw invalid(parsed.error);
  const saved = await writeJob(em, access, expected, parsed.value);
  if (saved) return saved;
  const current = await readJob(em, access);
  throw new ApiError(
    'stale-version',
    `${current.savedBy?.name ?? 'Somebody'} has saved version ${current.version} since; yours was made from ${expected}.`,
    { current },
    { etag: jobEtag(current.version) },
  );
}

/** Writes the document over version `expected`; null where that is no longer the saved one. */
export async function writeJob(
  em: EntityManager,
  { projectId, principal }: ProjectAccess,
  expected: number,
  job: Job,
): Promise<JobSaved | null> {
  const columns = jobColumns(job);
  const now = new Date();
  const version = expected + 1;
  const written = await em.nativeUpdate(
    Project,
    { id: projectId, version: expected, deletedAt: null },
    { ...columns, version, savedAt: now, savedBy: principal.userId, updatedAt: now },
  );
  if (written === 0) return null;
  return {
    version,
    hash: columns.jobHash,
    savedAt: now.toISOString(),
    savedBy: { id: principal.userId, name: principal.name },
  };
}
