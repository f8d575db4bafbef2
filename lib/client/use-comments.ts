import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { ChangeCommentBody, CreateCommentBody } from '@/lib/contracts/comment';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { callApi } from './call-api';

export const commentsKey = (projectId: string) => ['comments', projectId] as const;

/** Somebody else's comment shows within this time, ms. */
const REFRESH = 5000;

/** Comment threads of a project, oldest first. */
export function useComments(projectId: string) {
  return useQuery({
    queryKey: commentsKey(projectId),
    queryFn: ({ signal }) => callApi(ENDPOINTS.listComments, { params: { projectId } }, { signal }),
    refetchInterval: REFRESH,
  });
}

export function useCreateComment(projectId: string) {
  const refresh = useRefresh(projectId);
  return useMutation({
    mutationFn: (body: CreateCommentBody) =>
      callApi(ENDPOINTS.createComment, { params: { projectId }, body }),
    onSuccess: refresh,
  });
}

export function useReply(projectId: string) {
  const refresh = useRefresh(projectId);
  return useMutation({
    mutationFn: ({ commentId, text }: { commentId: string; text: string }) =>
      callApi(ENDPOINTS.createReply, { params: { projectId, commentId }, body: { text } }),
    onSuccess: refresh,
  });
}

/** Edits the text, resolves or reopens. */
export function useChangeComment(projectId: string) {
  const refresh = useRefresh(projectId);
  return useMutation({
    mutationFn: ({ commentId, change }: { commentId: string; change: ChangeCommentBody }) =>
      callApi(ENDPOINTS.changeComment, { params: { projectId, commentId }, body: change }),
    onSuccess: refresh,
  });
}

export function useDeleteComment(projectId: string) {
  const refresh = useRefresh(projectId);
  return useMutation({
    mutationFn: (commentId: string) => callApi(ENDPOINTS.deleteComment, { params: { projectId, commentId } }),
    onSuccess: refresh,
  });
}

function useRefresh(projectId: string): () => Promise<void> {
  const queryClient = useQueryClient();
  return () => queryClient.invalidateQueries({ queryKey: commentsKey(projectId) });
}
