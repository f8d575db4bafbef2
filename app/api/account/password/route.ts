import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { changePassword } from '@/lib/server/auth/account';
import { route } from '@/lib/server/http/route';

export const POST = route(ENDPOINTS.changePassword, ({ em, principal, body }) =>
  changePassword(em, principal, body),
);
