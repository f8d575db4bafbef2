import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { downloadArchive } from '@/lib/server/planning/project-programs';

export const GET = route(ENDPOINTS.getArchive, ({ em, project, request }) =>
  downloadArchive(em, project, request.signal),
);
