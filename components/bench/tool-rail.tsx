'use client';

import { classNames } from '@/components/ui/class-names';
import { Tooltip } from '@/components/ui/tooltip';
import type { ToolId } from '@/lib/editor/tools/tool';
import { useBench, useEditorState } from './bench-context';

interface ToolEntry {
  readonly id: ToolId;
  readonly label: string;
  readonly key: string;
  /** A pictogram on a 24 px square. */
  readonly sign: string;
  /** For those who may only look and comment, too. */
  readonly forReaders?: true;
}

/** The one table of tools: rail, keys and help read it. */
export const TOOLS: readonly ToolEntry[] = [
  {
    id: 'select',
    label: 'Select and move',
    key: 's',
    sign: 'M6 3l12 9-5 1.500 3 6-2.500 1-3-6L6 18z',
    forReaders: true,
  },
  {
    id: 'polyline',
    label: 'Line from point to point',
    key: 'l',
    sign: 'M4 18L9 7l6 8 5-10M2.500 16.500h3v3h-3z',
  },
  { id: 'rect', label: 'Rectangle', key: 'r', sign: 'M4 6h16v12H4z' },
  {
    id: 'ellipse',
    label: 'Ellipse',
    key: 'e',
    sign: 'M21 12c0 3.300-4 6-9 6s-9-2.700-9-6 4-6 9-6 9 2.700 9 6z',
  },
  {
    id: 'points',
    label: 'Points for holes',
    key: 'p',
    sign: 'M12 4v16M4 12h16M9 12a3 3 0 1 0 6 0 3 3 0 1 0-6 0',
  },
  {
    id: 'section',
    label: 'Section line',
    key: 'x',
    sign: 'M2 12h4M8 12h1M11 12h4M17 12h1M20 12h2M4 12V6M20 12V6M2.500 7.500L4 5l1.500 2.500M18.500 7.500L20 5l1.500 2.500',
    forReaders: true,
  },
  { id: 'comment', label: 'Comment on a spot', key: 'c', sign: 'M4 20V4h16v11H9z', forReaders: true },
];

/** A slim rail of what the hand can hold. */
export function ToolRail() {
  const { editor, readOnly } = useBench();
  const tool = useEditorState(({ session }) => session.tool);
  return (
    <div
      role="toolbar"
      aria-label="Tools"
      aria-orientation="vertical"
      className="flex shrink-0 gap-1 overflow-x-auto border-rule bg-sheet p-1.5 max-sm:order-last max-sm:border-t sm:flex-col sm:border-r"
    >
      {TOOLS.filter(({ forReaders }) => !readOnly || forReaders).map(({ id, label, key, sign }) => (
        <Tooltip key={id} text={label} keys={key.toUpperCase()} side="right">
          <button
            type="button"
            aria-label={label}
            aria-pressed={tool === id}
            aria-keyshortcuts={key}
            onClick={() => editor.look({ tool: id })}
            className={classNames(
              'grid size-9 shrink-0 place-items-center rounded border touch:size-11',
              tool === id ? 'border-tab bg-select' : 'border-transparent hover:bg-well',
            )}
          >
            <svg
              width="24"
              height="24"
              viewBox="0 0 24 24"
              fill="none"
              stroke="currentColor"
              strokeWidth="1.75"
              aria-hidden
            >
              <path d={sign} />
            </svg>
          </button>
        </Tooltip>
      ))}
    </div>
  );
}
