'use client';

import { createContext, useContext } from 'react';
import type { Job } from '@/lib/job/job-schema';
import type { SaveState } from '@/lib/client/bench/autosave';

export interface SaveStatus {
  readonly state: SaveState;
  /** The newest version that the server has committed. */
  readonly version: number;
  /** Sends what is waiting at once. */
  readonly saveNow: () => void;
  /** After a conflict: the server's document replaces this one. */
  readonly takeTheirs: (theirs: Job, version: number) => void;
  /** After a conflict: this document goes into a project of its own, and the server's is opened here. */
  readonly keepMineAsCopy: (theirs: Job, version: number) => Promise<void>;
}

const SaveStatusContext = createContext<SaveStatus | null>(null);
export const SaveStatusProvider = SaveStatusContext.Provider;

export function useSaveStatus(): SaveStatus {
  const status = useContext(SaveStatusContext);
  if (!status) throw new Error('useSaveStatus needs its provider');
  return status;
}
