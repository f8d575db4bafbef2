import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { readMe } from '@/lib/server/auth/account';
import { route } from '@/lib/server/http/route';

export const GET = route(ENDPOINTS.me, ({ em, principal }) => readMe(em, principal.userId));
