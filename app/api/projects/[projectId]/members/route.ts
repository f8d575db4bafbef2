import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { addMember, listMembers } from '@/lib/server/projects/members';

export const GET = route(ENDPOINTS.listMembers, ({ em, project }) => listMembers(em, project));
export const POST = route(ENDPOINTS.addMember, ({ em, project, body }) => addMember(em, project, body));
