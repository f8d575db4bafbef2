import { useQuery } from '@tanstack/react-query';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { callApi } from './call-api';

/** The programs that the server hands out for the saved document of `version`. */
export function usePrograms(projectId: string, version: number) {
  return useQuery({
    queryKey: ['programs', projectId, version],
    queryFn: ({ signal }) => callApi(ENDPOINTS.listPrograms, { params: { projectId } }, { signal }),
    placeholderData: (before) => before,
  });
}
