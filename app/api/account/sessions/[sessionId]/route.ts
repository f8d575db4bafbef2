import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { endSession } from '@/lib/server/auth/sessions';
import { route } from '@/lib/server/http/route';

export const DELETE = route(ENDPOINTS.endSession, ({ em, principal, params }) =>
  endSession(em, principal, params.sessionId),
);
