import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';

export const GET = route(ENDPOINTS.live, async () => ({ status: 'ok' as const }));
