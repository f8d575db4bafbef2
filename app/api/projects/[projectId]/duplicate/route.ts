import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { duplicateProject } from '@/lib/server/projects/create-project';

export const POST = route(ENDPOINTS.duplicateProject, ({ em, project, body }) =>
  duplicateProject(em, project, body.name),
);
