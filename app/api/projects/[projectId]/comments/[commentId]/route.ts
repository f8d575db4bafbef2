import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { changeComment, deleteComment } from '@/lib/server/comments/write-comments';
import { route } from '@/lib/server/http/route';

export const PATCH = route(ENDPOINTS.changeComment, ({ em, project, params, body }) =>
  changeComment(em, project, params.commentId, body),
);
export const DELETE = route(ENDPOINTS.deleteComment, ({ em, project, params }) =>
  deleteComment(em, project, params.commentId),
);
