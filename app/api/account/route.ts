import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { changeName } from '@/lib/server/auth/account';
import { route } from '@/lib/server/http/route';

export const PATCH = route(ENDPOINTS.changeAccount, ({ em, principal, body }) =>
  changeName(em, principal, body.name),
);
