import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import type { AddMemberBody, GivenRole } from '@/lib/contracts/member';
import { callApi } from './call-api';

const membersKey = (projectId: string) => ['members', projectId] as const;

/** Who is in a project. */
export function useMembers(projectId: string) {
  return useQuery({
    queryKey: membersKey(projectId),
    queryFn: ({ signal }) => callApi(ENDPOINTS.listMembers, { params: { projectId } }, { signal }),
  });
}

export function useAddMember(projectId: string) {
  const refresh = useRefresh(projectId);
  return useMutation({
    mutationFn: (body: AddMemberBody) => callApi(ENDPOINTS.addMember, { params: { projectId }, body }),
    onSuccess: refresh,
  });
}

export function useChangeMember(projectId: string) {
  const refresh = useRefresh(projectId);
  return useMutation({
    mutationFn: ({ userId, role }: { userId: string; role: GivenRole }) =>
      callApi(ENDPOINTS.changeMember, { params: { projectId, userId }, body: { role } }),
    onSuccess: refresh,
  });
}

export function useRemoveMember(projectId: string) {
  const refresh = useRefresh(projectId);
  return useMutation({
    mutationFn: (userId: string) => callApi(ENDPOINTS.removeMember, { params: { projectId, userId } }),
    onSuccess: refresh,
  });
}

function useRefresh(projectId: string): () => Promise<void> {
  const queryClient = useQueryClient();
  return () => queryClient.invalidateQueries({ queryKey: membersKey(projectId) });
}
