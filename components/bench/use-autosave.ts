'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, useRef, useState } from 'react';
import { ApiError, sentenceOf } from '@/lib/client/api-error';
import { createAutosave, type Autosave, type SaveOutcome, type SaveState } from '@/lib/client/bench/autosave';
import { deleteDraft, readDraft, writeDraft } from '@/lib/client/bench/local-draft';
import { callApi } from '@/lib/client/call-api';
import { refreshLists } from '@/lib/client/use-projects';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { jobEtag } from '@/lib/contracts/job-document';
import type { Editor } from '@/lib/editor/editor-store';
import type { Job } from '@/lib/job/job-schema';
import type { SaveStatus } from './save-status';

/** Saves the document as it changes and keeps a draft on this device until the server has committed it. */
export function useAutosave(projectId: string, start: number, editor: Editor, readOnly: boolean): SaveStatus {
  const [state, setState] = useState<SaveState>({ kind: 'saved' });
  const [version, setVersion] = useState(start);
  const autosave = useRef<Autosave | null>(null);
  const queryClient = useQueryClient();

  useEffect(() => {
    if (readOnly) return;
    const saving = createAutosave(start, {
      async save(job, from) {
        const outcome = await saveJob(projectId, job, from);
        if (outcome.kind === 'saved') {
          setVersion(outcome.version);
          void refreshLists(queryClient);
        }
        return outcome;
      },
      keepDraft: (job, from) => writeDraft(projectId, { job, version: from }),
      dropDraft: () => deleteDraft(projectId),
      onState: setState,
      later(ms, task) {
        const timer = setTimeout(task, ms);
        return () => clearTimeout(timer);
      },
    });
    autosave.current = saving;
    let last = editor.store.getState().history.present;
    const stopListening = editor.store.subscribe(({ history }) => {
      if (history.present === last) return;
      last = history.present;
      // A document that came from the server starts a history of its own and needs no saving.
      const isFromServer = history.past.length === 0 && history.future.length === 0;
      if (!isFromServer) saving.changed(last);
    });
    void takeUpDraft(projectId, start, editor, saving);
    const online = (): void => saving.now();
    const leaving = (event: BeforeUnloadEvent): void => {
      if (saving.pending()) event.preventDefault();
    };
    window.addEventListener('online', online);
    window.addEventListener('beforeunload', leaving);
    return () => {
      saving.stop();
      stopListening();
      window.removeEventListener('online', online);
      window.removeEventListener('beforeunload', leaving);
    };
  }, [projectId, start, editor, readOnly, queryClient]);

  return useMemo(
    () => ({
      state,
      version,
      saveNow: () => autosave.current?.now(),
      takeTheirs(theirs, newer) {
        setVersion(newer);
        editor.replace(theirs);
        autosave.current?.settle(newer, null);
      },
      async keepMineAsCopy(theirs, newer) {
        const mine = editor.store.getState().history.present;
        const name = `${mine.name} (my copy)`.slice(0, 200);
        await callApi(ENDPOINTS.createProject, { body: { from: 'job', job: { ...mine, name } } });
        void refreshLists(queryClient);
        setVersion(newer);
        editor.replace(theirs);
        autosave.current?.settle(newer, null);
      },
    }),
    [state, version, editor, queryClient],
  );
}

/** A change that never reached the server is taken up again, as one named step that can be undone. */
async function takeUpDraft(
  projectId: string,
  version: number,
  editor: Editor,
  autosave: Autosave,
): Promise<void> {
  const draft = await readDraft(projectId).catch(() => null);
  if (!draft || JSON.stringify(draft.job) === JSON.stringify(editor.job())) return;
  // Made on an older version than the server's: saving it must show the conflict, not write over what came since.
  if (draft.version !== version) autosave.settle(draft.version, null);
  editor.apply('Take up the changes kept on this device', draft.job);
}

async function saveJob(projectId: string, job: Job, version: number): Promise<SaveOutcome> {
  try {
    const saved = await callApi(
      ENDPOINTS.saveJob,
      { params: { projectId }, body: job },
      { headers: { 'if-match': jobEtag(version) } },
    );
    return { kind: 'saved', version: saved.version };
  } catch (error) {
    if (!(error instanceof ApiError)) return { kind: 'away', why: sentenceOf(error) };
    if (error.status === 412) {
      const newer = await callApi(ENDPOINTS.getJob, { params: { projectId } });
      return { kind: 'conflict', theirs: newer.job, version: newer.version };
    }
    return error.status >= 500 || error.status === 429
      ? { kind: 'away', why: error.message }
      : { kind: 'refused', why: error.message };
  }
}
