import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { readReport } from '@/lib/server/planning/project-programs';

export const GET = route(ENDPOINTS.getReport, ({ em, project, request }) =>
  readReport(em, project, request.signal),
);
