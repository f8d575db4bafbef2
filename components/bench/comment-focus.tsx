'use client';

import { createContext, useContext, useMemo, useState, type ReactNode } from 'react';
import type { CommentPin, CommentThread } from '@/lib/contracts/comment';
import { useBench } from './bench-context';

interface CommentFocus {
  /** The thread that is looked at. */
  readonly focus: string | null;
  readonly setFocus: (threadId: string | null) => void;
  /** Where a new comment is about to be pinned. */
  readonly pin: CommentPin | null;
  readonly setPin: (pin: CommentPin | null) => void;
  /** Turns the leaf and selects the cut so that the thread's place is seen. */
  readonly show: (thread: CommentThread) => void;
}

const CommentFocusContext = createContext<CommentFocus | null>(null);

export function CommentFocusProvider({ start, children }: { start: string | null; children: ReactNode }) {
  const { editor, openPanel } = useBench();
  const [focus, setFocus] = useState(start);
  const [pin, setPin] = useState<CommentPin | null>(null);
  const value = useMemo(
    (): CommentFocus => ({
      focus,
      setFocus,
      pin,
      setPin,
      show(thread) {
        setFocus(thread.id);
        openPanel('comments');
        const { pin: at } = thread;
        if (at.kind === 'spot') return editor.look({ face: at.face });
        const cut = editor.job().cuts.find(({ id }) => id === at.cut);
        if (!cut) return;
        editor.look({ face: cut.face });
        editor.select({ cut: cut.id, outlines: [] });
      },
    }),
    [focus, pin, editor, openPanel],
  );
  return <CommentFocusContext.Provider value={value}>{children}</CommentFocusContext.Provider>;
}

export function useCommentFocus(): CommentFocus {
  const focus = useContext(CommentFocusContext);
  if (!focus) throw new Error('useCommentFocus needs its provider');
  return focus;
}
