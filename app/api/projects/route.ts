import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { createProject } from '@/lib/server/projects/create-project';
import { listProjects } from '@/lib/server/projects/list-projects';

export const GET = route(ENDPOINTS.listProjects, ({ em, principal, query }) =>
  listProjects(em, principal, query),
);
export const POST = route(ENDPOINTS.createProject, ({ em, principal, body }) =>
  createProject(em, principal, body),
);
