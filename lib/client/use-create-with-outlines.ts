import { useMutation, useQueryClient } from '@tanstack/react-query';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { jobEtag } from '@/lib/contracts/job-document';
import type { Project } from '@/lib/contracts/project';
import type { DisplayUnit, JobInput } from '@/lib/job/job-schema';
import { callApi } from './call-api';
import { refreshLists } from './use-projects';

interface Start {
  readonly name: string;
  /** mm. */
  readonly board: { readonly x: number; readonly y: number; readonly z: number };
  readonly display: DisplayUnit;
  readonly outlines: JobInput['outlines'];
}

/** Makes a project on a board of its own and puts outlines into it. */
export function useCreateWithOutlines() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: createWithOutlines,
    onSuccess: () => refreshLists(queryClient),
  });
}

/**
 * The server knows what an empty job holds, so the outlines go into the one it makes. Where they are refused the empty
 * project is taken away again, and the refusal is thrown.
 */
async function createWithOutlines({ name, board, display, outlines }: Start): Promise<Project> {
  const project = await callApi(ENDPOINTS.createProject, { body: { from: 'empty', name, board, display } });
  const params = { projectId: project.id };
  try {
    const { job, version } = await callApi(ENDPOINTS.getJob, { params });
    await callApi(
      ENDPOINTS.saveJob,
      { params, body: { ...job, outlines } },
      { headers: { 'if-match': jobEtag(version) } },
    );
    return project;
  } catch (error) {
    await callApi(ENDPOINTS.deleteProject, { params }).catch(() => undefined);
    throw error;
  }
}
