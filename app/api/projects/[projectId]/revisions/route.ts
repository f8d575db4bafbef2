import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { createRevision, listRevisions } from '@/lib/server/projects/revisions';

export const GET = route(ENDPOINTS.listRevisions, ({ em, project }) => listRevisions(em, project));
export const POST = route(ENDPOINTS.createRevision, ({ em, project, body }) =>
  createRevision(em, project, body.note),
);
