import 'server-only';
import { type EntityManager, raw } from '@mikro-orm/postgresql';
import { endpointHref } from '@/lib/contracts/endpoint';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import type { Person } from '@/lib/contracts/moment';
import type { Project as ProjectAnswer, ProjectItem } from '@/lib/contracts/project';
import type { ProjectRole } from '@/lib/contracts/roles';
import { Comment } from '@/entities/comment.entity';
import { Project } from '@/entities/project.entity';
import { Revision } from '@/entities/revision.entity';
import type { User } from '@/entities/user.entity';
import type { ProjectAccess } from '../access/project-access';
import { notFound } from '../http/api-error';

/** A project as the API gives it, without its job document. */
export async function readProject(em: EntityManager, access: ProjectAccess): Promise<ProjectAnswer> {
  const project = await em.findOne(
    Project,
    { id: access.projectId, deletedAt: null },
    { populate: ['owner', 'shop'], refresh: true },
  );
  if (!project) throw notFound('The project');
  const [counts, newest] = await Promise.all([
    openCommentCounts(em.fork(), [project.id]),
    em.fork().findOne(Revision, { project: project.id }, { fields: ['number'], orderBy: { number: 'desc' } }),
  ]);
  const shop = project.shop?.getEntity() ?? null;
  return {
    ...projectItem(project, access.role, counts.get(project.id) ?? 0),
    shop: shop && { id: shop.id, name: shop.name },
    version: project.version,
    jobHash: project.jobHash,
    newestRevision: newest?.number ?? null,
  };
}

/** One card of the list; `project.owner` must be loaded. */
export function projectItem(project: Project, role: ProjectRole, openComments: number): ProjectItem {
  return {
    id: project.id,
    name: project.name,
    state: project.state,
    role,
    owner: personOf(project.owner.getEntity()),
    board: { x: project.boardX, y: project.boardY, z: project.boardZ },
    material: project.material,
    pictures: { A: pictureHref(project, 'A'), B: pictureHref(project, 'B') },
    openComments,
    createdAt: project.createdAt.toISOString(),
    updatedAt: project.updatedAt.toISOString(),
  };
}

/** Unresolved threads a project, for those that have any; one query for a whole page of projects. */
export async function openCommentCounts(
  em: EntityManager,
  projectIds: readonly string[],
): Promise<ReadonlyMap<string, number>> {
  const rows = await em
    .createQueryBuilder(Comment, 'c')
    .select(['c.project', raw('count(*)::int as open')])
    .where({ project: { $in: [...projectIds] }, thread: null, resolvedAt: null, deletedAt: null })
    .groupBy('c.project')
    .execute<{ project: string; open: number }[]>('all');
  return new Map(rows.map(({ project, open }) => [project, open]));
}

export function personOf(user: Pick<User, 'id' | 'name'>): Person {
  return { id: user.id, name: user.name };
}

/** The hash in the address changes with the document, so a picture may be kept for good. */
function pictureHref({ id, jobHash }: Project, face: 'A' | 'B'): string {
  return endpointHref(ENDPOINTS.getPicture, { projectId: id, face }, { v: jobHash.slice(0, 16) });
}
