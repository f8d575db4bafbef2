import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { changeMember, removeMember } from '@/lib/server/projects/members';

export const PATCH = route(ENDPOINTS.changeMember, ({ em, project, params, body }) =>
  changeMember(em, project, params.userId, body.role),
);
export const DELETE = route(ENDPOINTS.removeMember, ({ em, project, params }) =>
  removeMember(em, project, params.userId),
);
