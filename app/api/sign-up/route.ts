import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { signUp } from '@/lib/server/auth/account';
import { route } from '@/lib/server/http/route';

export const POST = route(ENDPOINTS.signUp, ({ em, body }) => signUp(em, body));
