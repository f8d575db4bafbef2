'use client';

import Link from 'next/link';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Skeleton } from '@/components/ui/skeleton';
import { EmptyState, ErrorState, NoPermissionState } from '@/components/ui/states';
import { useToast } from '@/components/ui/toast';
import { ApiError, sentenceOf } from '@/lib/client/api-error';
import { useDeleteProjects } from '@/lib/client/use-delete-projects';
import { useProjects } from '@/lib/client/use-projects';
import type { ProjectItem } from '@/lib/contracts/project';
import { FilterBar, type ListFilter } from './filter-bar';
import { NewProjectDialog, type NewProjectWay } from './new-project-dialog';
import { ProjectCard } from './project-card';
import { sortProjects } from './sort-projects';
import { useLaterValue } from './use-later-value';
import { useAllPages } from './use-all-pages';

const everything: ListFilter = { search: '', state: null, sort: 'changed' };

/** All projects one may open, and the ways to begin a new one. */
export function ProjectsPage() {
  const [filter, setFilter] = useState(everything);
  const [making, setMaking] = useState<NewProjectWay | null>(null);
  const search = useLaterValue(filter.search.trim(), 200);
  const list = useProjects({ search, state: filter.state });
  const toast = useToast();
  const deletion = useDeleteProjects((error) =>
    toast({ kind: 'error', text: `Not deleted. ${sentenceOf(error)}` }),
  );
  // In any order but the server's own, the first page alone would be the wrong one.
  useAllPages(list, filter.sort !== 'changed');

  const items = sortProjects(list.data?.pages.flatMap((page) => page.items) ?? [], filter.sort);
  const shown = items.filter((item) => !deletion.hidden.has(item.id));
  const filtered = search !== '' || filter.state !== null;

  function remove(project: ProjectItem) {
    deletion.remove(project.id);
    toast({
      text: `“${project.name}” deleted.`,
      action: { label: 'Undo', run: () => deletion.undo(project.id) },
    });
  }

  return (
    <main id="main" className="mx-auto grid max-w-[96rem] gap-6 px-4 py-6 sm:px-8 sm:py-8">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h1 className="text-3xl">Projects</h1>
        <Button variant="primary" icon="plus" onClick={() => setMaking('empty')}>
          New project
        </Button>
      </div>
      {list.isSuccess && items.length === 0 && !filtered ? null : (
        <FilterBar filter={filter} onChange={setFilter} />
      )}
      <p className="sr-only" role="status">
        {list.isSuccess
          ? `${shown.length}${list.hasNextPage ? ' or more' : ''} projects`
          : 'Reading the projects'}
      </p>
      {list.isPending ? <CardSkeletons /> : null}
      {list.isError && !list.data ? (
        <CannotRead error={list.error} onRetry={() => void list.refetch()} />
      ) : null}
      {list.isSuccess && shown.length === 0 ? (
        filtered ? (
          <NothingFound onClear={() => setFilter(everything)} />
        ) : (
          <NoProjects onMake={setMaking} />
        )
      ) : null}
      <ul
        aria-busy={list.isPlaceholderData}
        className={`grid gap-5 sm:grid-cols-2 lg:grid-cols-3 2xl:grid-cols-4 ${list.isPlaceholderData ? 'opacity-60' : ''}`}
      >
        {shown.map((project) => (
          <li key={project.id} className="grid">
            <ProjectCard project={project} onDelete={() => remove(project)} />
          </li>
        ))}
      </ul>
      {list.hasNextPage ? (
        <Button
          className="justify-self-center"
          busy={list.isFetchingNextPage}
          onClick={() => void list.fetchNextPage()}
        >
          Show more
        </Button>
      ) : null}
      <NewProjectDialog way={making} onWayChange={setMaking} />
    </main>
  );
}

function CannotRead({ error, onRetry }: { error: Error; onRetry: () => void }) {
  if (error instanceof ApiError && error.code === 'not-signed-in') {
    return (
      <NoPermissionState
        title="You are signed out"
        actions={
          <Button variant="primary" asChild>
            <Link href="/sign-in?callbackUrl=/projects">Sign in</Link>
          </Button>
        }
      >
        <p>Your session has ended. Sign in again to see your projects.</p>
      </NoPermissionState>
    );
  }
  return (
    <ErrorState title="The projects could not be read" onRetry={onRetry}>
      {sentenceOf(error)}
    </ErrorState>
  );
}

function NoProjects({ onMake }: { onMake: (way: NewProjectWay) => void }) {
  return (
    <EmptyState
      title="No projects yet"
      actions={
        <>
          <Button variant="primary" onClick={() => onMake('example')}>
            Open an example
          </Button>
          <Button onClick={() => onMake('file')}>From an SVG file</Button>
          <Button onClick={() => onMake('empty')}>From an empty board</Button>
        </>
      }
    >
      <p>An example shows a whole job on both faces. You can change it as you like; it is yours.</p>
    </EmptyState>
  );
}

function NothingFound({ onClear }: { onClear: () => void }) {
  return (
    <EmptyState title="No project fits" actions={<Button onClick={onClear}>Show all projects</Button>}>
      <p>Try fewer words, or another state.</p>
    </EmptyState>
  );
}

function CardSkeletons() {
  return (
    <div aria-hidden className="grid gap-5 sm:grid-cols-2 lg:grid-cols-3 2xl:grid-cols-4">
      {Array.from({ length: 6 }, (_, i) => (
        <div key={i} className="grid gap-3 border border-rule bg-sheet p-4">
          <Skeleton className="h-44" />
          <Skeleton className="h-6 w-2/3" />
          <Skeleton className="h-4 w-1/2" />
        </div>
      ))}
    </div>
  );
}
