import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { mayInProject, type ProjectPermission, type ProjectRole } from '@/lib/contracts/roles';
import { ProjectMember } from '@/entities/project-member.entity';
import { ApiError, notFound } from '../http/api-error';
import type { Principal } from '../auth/principal';

declare const proof: unique symbol;

/**
 * Proof that somebody may do something with a project: what reads and writes projects asks for one, and only
 * {@link requireProject} makes it. So no query can forget to ask.
 */
export interface ProjectAccess {
  readonly projectId: string;
  readonly role: ProjectRole;
  readonly principal: Principal;
  readonly [proof]: true;
}

/**
 * Lets `principal` into the project if their role has `permission`. To those outside, and once it is deleted, the
 * project is not there; a member whose role does not reach is told so.
 */
export async function requireProject(
  em: EntityManager,
  principal: Principal,
  projectId: string,
  permission: ProjectPermission,
): Promise<ProjectAccess> {
  const member = await em.findOne(ProjectMember, {
    project: { id: projectId, deletedAt: null },
    user: principal.userId,
  });
  if (!member) throw notFound('The project');
  if (!mayInProject(member.role, permission)) {
    throw new ApiError('forbidden', `As ${member.role} of this project you cannot do that; ask its owner.`);
  }
  return { projectId, role: member.role, principal } as ProjectAccess;
}
