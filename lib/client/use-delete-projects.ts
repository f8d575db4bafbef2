import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect, useRef, useState } from 'react';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { callApi } from './call-api';
import { refreshLists } from './use-projects';

/** As long as the note with `Undo` is on show, and a breath more. */
const TIME_TO_UNDO = 10_500;

interface DeleteProjects {
  /** Projects that are deleted as far as the person who looks is concerned. */
  readonly hidden: ReadonlySet<string>;
  remove(projectId: string): void;
  undo(projectId: string): void;
}

/**
 * Deletes with a way back: the project is out of sight at once, and the server is told when the time to undo is over or
 * the page is left. `onError` hears of a project that could not be deleted and so comes back.
 */
export function useDeleteProjects(onError: (error: unknown) => void): DeleteProjects {
  const queryClient = useQueryClient();
  const [hidden, setHidden] = useState<ReadonlySet<string>>(new Set());
  const waiting = useRef(new Map<string, ReturnType<typeof setTimeout>>());
  const report = useRef(onError);
  useEffect(() => {
    report.current = onError;
  });

  const show = useCallback((projectId: string) => {
    setHidden((now) => new Set([...now].filter((id) => id !== projectId)));
  }, []);

  const tellServer = useCallback(
    async (projectId: string) => {
      clearTimeout(waiting.current.get(projectId));
      if (!waiting.current.delete(projectId)) return;
      try {
        await callApi(ENDPOINTS.deleteProject, { params: { projectId } }, { keepalive: true });
        await refreshLists(queryClient);
      } catch (error) {
        report.current(error);
      }
      show(projectId);
    },
    [queryClient, show],
  );

  useEffect(() => {
    const still = waiting.current;
    const tellAll = () => [...still.keys()].forEach((id) => void tellServer(id));
    window.addEventListener('pagehide', tellAll);
    return () => {
      window.removeEventListener('pagehide', tellAll);
      tellAll();
    };
  }, [tellServer]);

  const remove = useCallback(
    (projectId: string) => {
      setHidden((now) => new Set(now).add(projectId));
      waiting.current.set(
        projectId,
        setTimeout(() => void tellServer(projectId), TIME_TO_UNDO),
      );
    },
    [tellServer],
  );

  const undo = useCallback(
    (projectId: string) => {
      clearTimeout(waiting.current.get(projectId));
      waiting.current.delete(projectId);
      show(projectId);
    },
    [show],
  );

  return { hidden, remove, undo };
}
