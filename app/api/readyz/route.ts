import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { checkReady } from '@/lib/server/readiness';

export const GET = route(ENDPOINTS.ready, ({ em }) => checkReady(em));
