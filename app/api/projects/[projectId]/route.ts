import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { changeProject, deleteProject } from '@/lib/server/projects/change-project';
import { readProject } from '@/lib/server/projects/project-answer';

export const GET = route(ENDPOINTS.getProject, ({ em, project }) => readProject(em, project));
export const PATCH = route(ENDPOINTS.changeProject, ({ em, project, body }) =>
  changeProject(em, project, body),
);
export const DELETE = route(ENDPOINTS.deleteProject, ({ em, project }) => deleteProject(em, project));
