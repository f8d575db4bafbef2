import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { createReply } from '@/lib/server/comments/write-comments';
import { route } from '@/lib/server/http/route';

export const POST = route(ENDPOINTS.createReply, ({ em, project, params, body }) =>
  createReply(em, project, params.commentId, body.text),
);
