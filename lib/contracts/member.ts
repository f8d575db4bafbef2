import { z } from 'zod';
import { email } from './account';
import { moment, person } from './moment';
import { projectRole } from './roles';

/** E-mail addresses of members are shown to the project's owner alone; others get null. */
export const projectMember = z.object({
  person,
  email: z.string().nullable(),
  role: projectRole,
  addedAt: moment,
});
export type ProjectMember = z.infer<typeof projectMember>;

export const projectMembers = z.object({ items: z.array(projectMember) });
export type ProjectMembers = z.infer<typeof projectMembers>;

/** Roles that can be given; a project has one owner, its maker. */
export const givenRole = z.enum(['editor', 'reviewer']);
export type GivenRole = z.infer<typeof givenRole>;

export const addMemberBody = z.strictObject({ email, role: givenRole });
export type AddMemberBody = z.infer<typeof addMemberBody>;

export const changeMemberBody = z.strictObject({ role: givenRole });
export type ChangeMemberBody = z.infer<typeof changeMemberBody>;
