import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { downloadProgram } from '@/lib/server/planning/project-programs';

export const GET = route(ENDPOINTS.getProgram, ({ em, project, params, request }) =>
  downloadProgram(em, project, params.file, request.signal),
);
