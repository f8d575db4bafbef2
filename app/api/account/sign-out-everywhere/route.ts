import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { endSessions } from '@/lib/server/auth/sessions';
import { route } from '@/lib/server/http/route';

export const POST = route(ENDPOINTS.signOutEverywhere, ({ em, principal }) =>
  endSessions(em, principal.userId),
);
