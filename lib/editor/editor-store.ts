import { createStore, type StoreApi } from 'zustand/vanilla';
import { turnPoint } from '@/lib/job/turn';
import type { Job } from '@/lib/job/job-schema';
import { record, redo, startHistory, undo, type History } from './history';
import { NOTHING_SELECTED, startSession, type Selection, type Session } from './session';

/**
 * The bench's state: the document with its history, the running gesture's preview, and the session. What is derived of
 * them (outlines, paths, findings) lives elsewhere and is thrown away freely.
 */
export interface EditorState {
  readonly history: History<Job>;
  /** The document while a gesture is running; null between gestures. */
  readonly preview: Job | null;
  readonly session: Session;
}

export interface Editor {
  readonly store: StoreApi<EditorState>;
  /** The document as it is seen: the gesture's preview while there is one. */
  job(): Job;
  /** Makes `job` the document, as one named step. Ends a running gesture. */
  apply(label: string, job: Job): void;
  /** Shows `job` without making a step; `cancel` brings the document back exactly. */
  preview(job: Job): void;
  cancel(): void;
  undo(): void;
  redo(): void;
  /** Takes `job` as it stands on the server, with a history of its own. */
  replace(job: Job): void;
  look(patch: Partial<Session>): void;
  select(selection: Partial<Selection>): void;
}

export function createEditor(job: Job): Editor {
  const store = createStore<EditorState>(() => ({
    history: startHistory(job),
    preview: null,
    session: startSession(job.board, job.order[0] ?? 'A'),
  }));
  const setHistory = (next: History<Job>): void =>
    store.setState(({ session }) => ({
      history: next,
      preview: null,
      session: { ...session, selection: stillThere(session.selection, next.present) },
    }));

  return {
    store,
    job: () => seenJob(store.getState()),
    apply: (label, next) => setHistory(record(store.getState().history, label, next)),
    preview: (next) => store.setState({ preview: next }),
    cancel: () => {
      if (store.getState().preview) store.setState({ preview: null });
    },
    undo: () => setHistory(undo(store.getState().history)),
    redo: () => setHistory(redo(store.getState().history)),
    replace: (next) => setHistory(startHistory(next)),
    look: (patch) =>
      store.setState(({ session, history }) => ({ session: look(session, patch, history.present) })),
    select: (selection) =>
      store.setState(({ session }) => ({
        session: { ...session, selection: { ...session.selection, ...selection } },
      })),
  };
}

/** The document of a state as it is seen: with the running gesture. */
export function seenJob({ preview, history }: EditorState): Job {
  return preview ?? history.present;
}

/** When the leaf turns, the section line stays where it is in the wood. */
function look(session: Session, patch: Partial<Session>, { board, turn }: Job): Session {
  if (patch.face === undefined || patch.face === session.face || patch.section)
    return { ...session, ...patch };
  const carry = (p: { x: number; y: number }): { x: number; y: number } => turnPoint(board, turn.axis, p);
  const section = { from: carry(session.section.from), to: carry(session.section.to) };
  return { ...session, section, ...patch };
}

function stillThere(selection: Selection, job: Job): Selection {
  const outlines = selection.outlines.filter((id) => job.outlines.some((outline) => outline.id === id));
  const cut = job.cuts.some(({ id }) => id === selection.cut) ? selection.cut : null;
  if (outlines.length === selection.outlines.length && cut === selection.cut) return selection;
  return outlines.length === 0 && cut === null ? NOTHING_SELECTED : { outlines, cut };
}
