/** One step that can be taken back: what it was called and the whole document before it. Documents are immutable. */
export interface HistoryStep<Doc> {
  readonly label: string;
  readonly doc: Doc;
}

/**
 * Undo without end by reference: each step holds the document as it was, which shares all that did not change with its
 * neighbours, so a thousand steps cost little more than the parts that moved.
 */
export interface History<Doc> {
  readonly past: readonly HistoryStep<Doc>[];
  readonly present: Doc;
  readonly future: readonly HistoryStep<Doc>[];
}

export function startHistory<Doc>(present: Doc): History<Doc> {
  return { past: [], present, future: [] };
}

/** The history after `label` made `next` of the present. A change that changes nothing leaves no step. */
export function record<Doc>(history: History<Doc>, label: string, next: Doc): History<Doc> {
  if (next === history.present) return history;
  return { past: [...history.past, { label, doc: history.present }], present: next, future: [] };
}

/** One step back, or the same history where there is none. */
export function undo<Doc>(history: History<Doc>): History<Doc> {
  const step = history.past.at(-1);
  if (!step) return history;
  return {
    past: history.past.slice(0, -1),
    present: step.doc,
    future: [{ label: step.label, doc: history.present }, ...history.future],
  };
}

/** One step forward again, or the same history where there is none. */
export function redo<Doc>(history: History<Doc>): History<Doc> {
  const [step, ...future] = history.future;
  if (!step) return history;
  return {
    past: [...history.past, { label: step.label, doc: history.present }],
    present: step.doc,
    future,
  };
}
