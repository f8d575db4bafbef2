import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { listPrograms } from '@/lib/server/planning/project-programs';

export const GET = route(ENDPOINTS.listPrograms, ({ em, project, request }) =>
  listPrograms(em, project, request.signal),
);
