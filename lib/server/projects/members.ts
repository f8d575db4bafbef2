import 'server-only';
import { type EntityManager, UniqueConstraintViolationException } from '@mikro-orm/postgresql';
import type {
  AddMemberBody,
  GivenRole,
  ProjectMember as MemberAnswer,
  ProjectMembers,
} from '@/lib/contracts/member';
import { ProjectMember } from '@/entities/project-member.entity';
import { User } from '@/entities/user.entity';
import type { ProjectAccess } from '../access/project-access';
import { ApiError, notFound } from '../http/api-error';
import { personOf } from './project-answer';

/** Who is in the project: the owner first, then by when they were added. */
export async function listMembers(em: EntityManager, access: ProjectAccess): Promise<ProjectMembers> {
  const members = await em.find(
    ProjectMember,
    { project: access.projectId },
    { populate: ['user'], orderBy: { addedAt: 'asc', user: { id: 'asc' } } },
  );
  const ownerFirst = members.toSorted((a, b) => Number(b.role === 'owner') - Number(a.role === 'owner'));
  return { items: ownerFirst.map((member) => memberAnswer(member, access)) };
}

/** Adds the account with this address; that there is none is told to the owner alone, who has to know. */
export async function addMember(
  em: EntityManager,
  access: ProjectAccess,
  { email, role }: AddMemberBody,
): Promise<MemberAnswer> {
  const user = await em.findOne(User, { email });
  if (!user)
    throw new ApiError('not-found', 'There is no account with this address; ask them to sign up first.');
  try {
    await em.insert(ProjectMember, { project: access.projectId, user: user.id, role, addedAt: new Date() });
  } catch (error) {
    if (!(error instanceof UniqueConstraintViolationException)) throw error;
    throw new ApiError('conflict', `${user.name} is in the project already.`);
  }
  return readMember(em, access, user.id);
}

export async function changeMember(
  em: EntityManager,
  access: ProjectAccess,
  userId: string,
  role: GivenRole,
): Promise<MemberAnswer> {
  const changed = await em.nativeUpdate(ProjectMember, givenRole(access, userId), { role });
  if (changed === 0) throw await whyNot(em, access, userId);
  return readMember(em, access, userId);
}

/** The owner removes anybody else; the others only themselves. */
export async function removeMember(em: EntityManager, access: ProjectAccess, userId: string): Promise<void> {
  if (access.role !== 'owner' && userId !== access.principal.userId) {
    throw new ApiError('forbidden', 'Only the owner can remove somebody else.');
  }
  const removed = await em.nativeDelete(ProjectMember, givenRole(access, userId));
  if (removed === 0) throw await whyNot(em, access, userId);
}

/** The owner's own row is never changed or removed: a project always has one owner. */
function givenRole({ projectId }: ProjectAccess, userId: string) {
  return { project: projectId, user: userId, role: { $ne: 'owner' as const } };
}

async function whyNot(em: EntityManager, { projectId }: ProjectAccess, userId: string): Promise<ApiError> {
  const there = await em.count(ProjectMember, { project: projectId, user: userId });
  return there > 0 ? new ApiError('conflict', 'The owner stays the owner.') : notFound('The member');
}

async function readMember(em: EntityManager, access: ProjectAccess, userId: string): Promise<MemberAnswer> {
  const member = await em
    .fork()
    .findOne(ProjectMember, { project: access.projectId, user: userId }, { populate: ['user'] });
  if (!member) throw notFound('The member');
  return memberAnswer(member, access);
}

function memberAnswer(member: ProjectMember, { role }: ProjectAccess): MemberAnswer {
  const user = member.user.getEntity();
  return {
    person: personOf(user),
    email: role === 'owner' ? user.email : null,
    role: member.role,
    addedAt: member.addedAt.toISOString(),
  };
}
