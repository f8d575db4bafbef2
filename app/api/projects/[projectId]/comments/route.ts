import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { listComments } from '@/lib/server/comments/list-comments';
import { createComment } from '@/lib/server/comments/write-comments';
import { route } from '@/lib/server/http/route';

export const GET = route(ENDPOINTS.listComments, ({ em, project }) => listComments(em, project));
export const POST = route(ENDPOINTS.createComment, ({ em, project, body }) =>
  createComment(em, project, body),
);
