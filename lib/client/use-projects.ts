import {
  useInfiniteQuery,
  useMutation,
  useQuery,
  useQueryClient,
  type QueryClient,
} from '@tanstack/react-query';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import type { ChangeProjectBody, CreateProjectBody, ProjectState } from '@/lib/contracts/project';
import { callApi } from './call-api';

export const projectsKey = ['projects'] as const;
export const projectKey = (projectId: string) => ['project', projectId] as const;

export interface ProjectFilter {
  readonly search: string;
  readonly state: ProjectState | null;
}

/** The projects one is a member of, newest change first, page after page. */
export function useProjects({ search, state }: ProjectFilter) {
  return useInfiniteQuery({
    queryKey: [...projectsKey, search, state],
    queryFn: ({ pageParam, signal }) =>
      callApi(
        ENDPOINTS.listProjects,
        { query: { search, ...(state ? { state } : {}), ...(pageParam ? { cursor: pageParam } : {}) } },
        { signal },
      ),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.nextCursor,
    // The cards of the last search stay, dimmed, until those of the new one are there.
    placeholderData: (before) => before,
  });
}

/** One project without its job document. */
export function useProject(projectId: string) {
  return useQuery({
    queryKey: projectKey(projectId),
    queryFn: ({ signal }) => callApi(ENDPOINTS.getProject, { params: { projectId } }, { signal }),
  });
}

export function useCreateProject() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: CreateProjectBody) => callApi(ENDPOINTS.createProject, { body }),
    onSuccess: () => refreshLists(queryClient),
  });
}

export function useChangeProject() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ projectId, change }: { projectId: string; change: ChangeProjectBody }) =>
      callApi(ENDPOINTS.changeProject, { params: { projectId }, body: change }),
    onSuccess: (project) => {
      queryClient.setQueryData(projectKey(project.id), project);
      return refreshLists(queryClient);
    },
  });
}

export function useDuplicateProject() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (projectId: string) =>
      callApi(ENDPOINTS.duplicateProject, { params: { projectId }, body: {} }),
    onSuccess: () => refreshLists(queryClient),
  });
}

/** Reads every list of projects again. */
export function refreshLists(queryClient: QueryClient): Promise<void> {
  return queryClient.invalidateQueries({ queryKey: projectsKey });
}
