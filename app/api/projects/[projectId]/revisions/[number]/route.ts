import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { readRevision } from '@/lib/server/projects/revisions';

export const GET = route(ENDPOINTS.getRevision, ({ em, project, params }) =>
  readRevision(em, project, params.number),
);
