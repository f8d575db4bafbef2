import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { ChangeProjectBody, Project as ProjectAnswer } from '@/lib/contracts/project';
import { Project } from '@/entities/project.entity';
import type { ProjectAccess } from '../access/project-access';
import { ApiError, notFound } from '../http/api-error';
import { readProject } from './project-answer';
import { readJob, writeJob } from './saved-job';

/** How often a rename is tried again when others save in between. */
const TRIES = 5;

/** Changes name or state. The name is the job document's, so a new one is a new version of it. */
export async function changeProject(
  em: EntityManager,
  access: ProjectAccess,
  { name, state }: ChangeProjectBody,
): Promise<ProjectAnswer> {
  if (name !== undefined) await rename(em, access, name);
  if (state !== undefined) {
    await em.nativeUpdate(
      Project,
      { id: access.projectId, deletedAt: null },
      { state, updatedAt: new Date() },
    );
  }
  return readProject(em, access);
}

async function rename(em: EntityManager, access: ProjectAccess, name: string): Promise<void> {
  for (let tries = 0; tries < TRIES; tries++) {
    const { job, version } = await readJob(em, access);
    if (job.name === name || (await writeJob(em, access, version, { ...job, name }))) return;
  }
  throw new ApiError('conflict', 'Others are saving at the same time; try again.');
}

/** Deletes softly: the rows stay, but from now on the project is not there for anybody. */
export async function deleteProject(em: EntityManager, { projectId }: ProjectAccess): Promise<void> {
  const deleted = await em.nativeUpdate(
    Project,
    { id: projectId, deletedAt: null },
    { deletedAt: new Date() },
  );
  if (deleted === 0) throw notFound('The project');
}
