'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Icon } from '@/components/ui/icon';
import { Notice } from '@/components/ui/notice';
import { Tooltip } from '@/components/ui/tooltip';
import { sentenceOf } from '@/lib/client/api-error';
import type { SaveState } from '@/lib/client/bench/autosave';
import { useSaveStatus } from './save-status';
import { useBench } from './bench-context';

/** Says where the newest change is: on the server, on its way, or on this device alone. */
export function SaveMark() {
  const { state, saveNow } = useSaveStatus();
  const { readOnly } = useBench();
  if (readOnly) return <span className="text-bar-quiet">read only</span>;
  switch (state.kind) {
    case 'saved':
      return (
        <span role="status" className="flex items-center gap-1 text-bar-quiet">
          <Icon name="check" size={16} /> saved
        </span>
      );
    case 'saving':
      return (
        <span role="status" className="text-bar-quiet">
          saving…
        </span>
      );
    case 'device':
      return (
        <Tooltip text={state.why}>
          <button type="button" className="ring-bar flex items-center gap-1 underline" onClick={saveNow}>
            <Icon name="device" size={16} /> only on this device
          </button>
        </Tooltip>
      );
    case 'conflict':
      return <Conflict state={state} />;
  }
}

/** Somebody saved another version meanwhile: nothing is lost, and nothing is chosen for the person. */
function Conflict({ state }: { state: Extract<SaveState, { kind: 'conflict' }> }) {
  const { takeTheirs, keepMineAsCopy } = useSaveStatus();
  const [open, setOpen] = useState(true);
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const copy = async (): Promise<void> => {
    setBusy(true);
    setProblem(null);
    try {
      await keepMineAsCopy(state.theirs, state.version);
    } catch (error) {
      setProblem(sentenceOf(error));
    }
    setBusy(false);
  };
  return (
    <>
      <button
        type="button"
        className="ring-bar flex items-center gap-1 underline"
        onClick={() => setOpen(true)}
      >
        <Icon name="warning" size={16} /> conflict
      </button>
      <Dialog
        open={open}
        onOpenChange={setOpen}
        title="This project was changed elsewhere"
        description="Somebody, or you in another window, saved a newer version while you worked. Yours is kept on this device."
        width="narrow"
        actions={
          <>
            <Button onClick={() => takeTheirs(state.theirs, state.version)}>Take theirs</Button>
            <Button variant="primary" busy={busy} onClick={() => void copy()}>
              Keep mine as a copy
            </Button>
          </>
        }
      >
        <p>
          <strong className="font-medium">Take theirs</strong> shows the newer version here and drops your
          last changes. <strong className="font-medium">Keep mine as a copy</strong> puts your version into a
          project of its own first.
        </p>
        {problem ? <Notice kind="error">{problem}</Notice> : null}
      </Dialog>
    </>
  );
}
