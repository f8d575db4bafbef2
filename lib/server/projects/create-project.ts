import 'server-only';
import { randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { parseJob } from '@/lib/job/parse-job';
import type { Job } from '@/lib/job/job-schema';
import type { CreateProjectBody, Project as ProjectAnswer } from '@/lib/contracts/project';
import { Membership } from '@/entities/membership.entity';
import { Project } from '@/entities/project.entity';
import { ProjectMember } from '@/entities/project-member.entity';
import { type ProjectAccess, requireProject } from '../access/project-access';
import type { Principal } from '../auth/principal';
import { notFound } from '../http/api-error';
import { invalid } from '../http/check-input';
import { emptyJob } from './empty-job';
import { exampleJob } from './example-jobs';
import { jobColumns } from './job-columns';
import { readProject } from './project-answer';

/** Makes a project that `principal` owns. */
export async function createProject(
  em: EntityManager,
  principal: Principal,
  body: CreateProjectBody,
): Promise<ProjectAnswer> {
  return storeProject(em, principal, startingJob(body));
}

/** Copies the job document into a project that the asking person owns; members, comments and revisions stay behind. */
export async function duplicateProject(
  em: EntityManager,
  { projectId, principal }: ProjectAccess,
  name: string | undefined,
): Promise<ProjectAnswer> {
  const source = await em.findOne(Project, { id: projectId, deletedAt: null }, { populate: ['job'] });
  if (!source?.job) throw notFound('The project');
  return storeProject(em, principal, { ...source.job, name: name ?? copyName(source.name) });
}

function startingJob(body: CreateProjectBody): Job {
  switch (body.from) {
    case 'empty':
      return emptyJob(body.name, body.board, body.display);
    case 'example':
      return named(exampleJob(body.example), body.name);
    case 'job': {
      const parsed = parseJob(body.job);
      if (!parsed.ok) {
        throw invalid(parsed.error.map(({ path, message }) => ({ path: `job.${path}`, message })));
      }
      return named(parsed.value, body.name);
    }
  }
}

function named(job: Job, name: string | undefined): Job {
  return name === undefined ? job : { ...job, name };
}

async function storeProject(em: EntityManager, principal: Principal, job: Job): Promise<ProjectAnswer> {
  const id = randomUUID();
  const now = new Date();
  const shop = await em.findOne(Membership, { user: principal.userId }, { orderBy: { addedAt: 'asc' } });
  await em.transactional(async (tx) => {
    await tx.insert(Project, {
      id,
      ...jobColumns(job),
      state: 'draft',
      owner: principal.userId,
      shop: shop?.shop.id ?? null,
      version: 1,
      savedAt: now,
      savedBy: principal.userId,
      createdAt: now,
      updatedAt: now,
    });
    await tx.insert(ProjectMember, { project: id, user: principal.userId, role: 'owner', addedAt: now });
  });
  return readProject(em, await requireProject(em, principal, id, 'project.read'));
}

function copyName(name: string): string {
  return `${name.slice(0, 190)} (copy)`;
}
