import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { listSessions } from '@/lib/server/auth/sessions';
import { route } from '@/lib/server/http/route';

export const GET = route(ENDPOINTS.listSessions, ({ em, principal }) => listSessions(em, principal));
