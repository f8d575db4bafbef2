import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { readPicture } from '@/lib/server/planning/project-picture';

export const GET = route(ENDPOINTS.getPicture, ({ em, project, params, request }) =>
  readPicture(em, project, params.face, request),
);
