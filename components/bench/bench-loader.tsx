'use client';

import { useQuery } from '@tanstack/react-query';
import dynamic from 'next/dynamic';
import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { ErrorState, LoadingState, NoPermissionState } from '@/components/ui/states';
import { ApiError, sentenceOf } from '@/lib/client/api-error';
import { loadFontBook } from '@/lib/client/bench/load-font-book';
import { callApi } from '@/lib/client/call-api';
import { useProject } from '@/lib/client/use-projects';
import { ENDPOINTS } from '@/lib/contracts/endpoints';

/** The bench draws on a canvas, which only a browser has. */
const Bench = dynamic(() => import('./bench').then((module) => module.Bench), {
  ssr: false,
  loading: () => <LoadingState title="Laying out the bench" />,
});

/** Fetches what the bench needs, and says what is wrong where it cannot be had. */
export function BenchLoader({ projectId, comment }: { projectId: string; comment: string | null }) {
  const project = useProject(projectId);
  const job = useQuery({
    queryKey: ['job', projectId],
    queryFn: ({ signal }) => callApi(ENDPOINTS.getJob, { params: { projectId } }, { signal }),
    // The bench holds the document from here on; a refetch must not replace what is being drawn.
    staleTime: Number.POSITIVE_INFINITY,
    gcTime: 0,
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });
  const fonts = useQuery({ queryKey: ['fonts'], queryFn: loadFontBook, staleTime: Number.POSITIVE_INFINITY });
  const error = project.error ?? job.error ?? fonts.error;
  if (error instanceof ApiError && error.status === 404) {
    return (
      <NoPermissionState
        level={1}
        title="There is no such project here"
        actions={
          <Button variant="primary" asChild>
            <Link href="/projects">All projects</Link>
          </Button>
        }
      >
        It may have been deleted, or its owner has not shared it with you.
      </NoPermissionState>
    );
  }
  if (error) {
    const retry = (): void => {
      for (const query of [project, job, fonts]) if (query.isError) void query.refetch();
    };
    return (
      <ErrorState level={1} title="The project did not open" onRetry={retry}>
        {sentenceOf(error)}
      </ErrorState>
    );
  }
  if (!project.data || !job.data || !fonts.data) return <LoadingState title="Fetching the project" />;
  return (
    <Bench
      key={projectId}
      project={project.data}
      job={job.data.job}
      version={job.data.version}
      fonts={fonts.data}
      comment={comment}
    />
  );
}
