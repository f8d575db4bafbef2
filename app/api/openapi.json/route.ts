import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { openApi } from '@/lib/server/open-api';

export const GET = route(ENDPOINTS.openapi, async () => openApi());
