'use client';

import { useEffect } from 'react';
import { duplicateOutlines, deleteOutlines, moveOutlines } from '@/lib/editor/edits/edit-outlines';
import { deleteCut } from '@/lib/editor/edits/edit-cuts';
import { useBench, type Bench } from './bench-context';
import { isTyping } from './plan-view';
import { TOOLS } from './tool-rail';

interface KeyCommand {
  /** As people read it. */
  readonly keys: string;
  readonly label: string;
  readonly matches: (event: KeyboardEvent) => boolean;
  readonly run: (bench: Bench, event: KeyboardEvent) => void;
  /** Changes the document. */
  readonly edits: boolean;
}

const withControl = (event: KeyboardEvent): boolean => event.ctrlKey || event.metaKey;
const plain = (event: KeyboardEvent): boolean => !withControl(event) && !event.altKey;
const ARROWS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

/** The one table of keys: what is pressed, what it is called, what it does. */
export const KEY_COMMANDS: readonly KeyCommand[] = [
  {
    keys: 'Ctrl Z',
    label: 'Undo',
    edits: true,
    matches: (event) => withControl(event) && !event.shiftKey && event.key.toLowerCase() === 'z',
    run: ({ editor }) => editor.undo(),
  },
  {
    keys: 'Ctrl Shift Z, Ctrl Y',
    label: 'Redo',
    edits: true,
    matches: (event) =>
      withControl(event) &&
      (event.key.toLowerCase() === 'y' || (event.shiftKey && event.key.toLowerCase() === 'z')),
    run: ({ editor }) => editor.redo(),
  },
  {
    keys: 'Ctrl D',
    label: 'Duplicate what is selected',
    edits: true,
    matches: (event) => withControl(event) && event.key.toLowerCase() === 'd',
    run({ editor }) {
      const { outlines } = editor.store.getState().session.selection;
      if (outlines.length === 0) return;
      const copies = duplicateOutlines(editor.job(), outlines, 10);
      editor.apply('Duplicate outlines', copies.job);
      editor.select({ outlines: copies.ids });
    },
  },
  {
    keys: 'Ctrl A',
    label: 'Select all outlines',
    edits: false,
    matches: (event) => withControl(event) && event.key.toLowerCase() === 'a',
    run: ({ editor }) => editor.select({ outlines: editor.job().outlines.map(({ id }) => id) }),
  },
  {
    keys: 'Delete',
    label: 'Delete what is selected',
    edits: true,
    matches: (event) => event.key === 'Delete',
    run({ editor }) {
      const { outlines, cut } = editor.store.getState().session.selection;
      if (outlines.length > 0) editor.apply('Delete outlines', deleteOutlines(editor.job(), outlines));
      else if (cut !== null) editor.apply('Delete cut', deleteCut(editor.job(), cut));
    },
  },
  {
    keys: 'Arrows',
    label: 'Move by 1 mm; with Shift by 10, with Alt by 0.1',
    edits: true,
    matches: (event) => event.key in ARROWS && !withControl(event),
    run({ editor }, event) {
      const { selection, face } = editor.store.getState().session;
      const way = ARROWS[event.key];
      if (!way || selection.outlines.length === 0) return;
      const step = event.shiftKey ? 10 : event.altKey ? 0.1 : 1;
      editor.apply(
        'Move outlines',
        moveOutlines(editor.job(), selection.outlines, face, way[0] * step, way[1] * step),
      );
    },
  },
  {
    keys: 'F',
    label: 'Turn the leaf over',
    edits: false,
    matches: (event) => plain(event) && event.key.toLowerCase() === 'f',
    run: ({ editor }) => editor.look({ face: editor.store.getState().session.face === 'A' ? 'B' : 'A' }),
  },
  ...TOOLS.map(({ id, key, label, forReaders }): KeyCommand => ({
    keys: key.toUpperCase(),
    label,
    edits: !forReaders,
    matches: (event) => plain(event) && event.key.toLowerCase() === key,
    run: ({ editor }) => editor.look({ tool: id }),
  })),
];

/** Listens for the table's keys while nothing is being typed. */
export function BenchKeys() {
  const bench = useBench();
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent): void => {
      if (isTyping(event.target)) return;
      const command = KEY_COMMANDS.find(({ matches }) => matches(event));
      if (!command || (command.edits && bench.readOnly)) return;
      // A focused list or button keeps its own arrows.
      if (
        event.key in ARROWS &&
        event.target instanceof HTMLElement &&
        event.target.closest('[role="radiogroup"], [role="toolbar"], aside')
      )
        return;
      event.preventDefault();
      command.run(bench, event);
    };
    window.addEventListener('keydown', onKeyDown);
    return () => window.removeEventListener('keydown', onKeyDown);
  }, [bench]);
  return null;
}
