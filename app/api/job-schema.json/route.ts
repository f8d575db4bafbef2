import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { jobJsonSchema } from '@/lib/job/json-schema';
import { route } from '@/lib/server/http/route';

export const GET = route(ENDPOINTS.jobJsonSchema, async () => jobJsonSchema());
