import { defineEntity, type InferEntity, p } from '@mikro-orm/core';
import { PROJECT_ROLES } from '@/lib/contracts/roles';
import { Project } from './project.entity';
import { User } from './user.entity';

/** Somebody's role in a project; the owner has a row too, so that one look-up answers who may. */
export const ProjectMember = defineEntity({
  name: 'ProjectMember',
  tableName: 'project_members',
  indexes: [{ name: 'project_members_user_index', properties: ['user', 'project'] }],
  properties: {
    project: () => p.manyToOne(Project).primary().ref().deleteRule('cascade'),
    user: () => p.manyToOne(User).primary().ref().deleteRule('cascade'),
    role: p.enum([...PROJECT_ROLES]),
    addedAt: p.datetime(3),
  },
});
export type ProjectMember = InferEntity<typeof ProjectMember>;
