'use client';

import { Icon } from '@/components/ui/icon';
import { EmptyState } from '@/components/ui/states';
import { Tag } from '@/components/ui/tag';
import { classNames } from '@/components/ui/class-names';
import { seenJob } from '@/lib/editor/editor-store';
import { useBench, useEditorState } from '../bench-context';
import { ImportButton } from '../import/import-button';

/** Every outline by name, with the cuts made of it: the document for those who do not see the plan, too. */
export function OutlinesPanel() {
  const { editor, readOnly } = useBench();
  const job = useEditorState(seenJob);
  const selected = useEditorState(({ session }) => session.selection.outlines);
  return (
    <div className="grid gap-3">
      {readOnly ? null : <ImportButton />}
      {job.outlines.length === 0 ? (
        <EmptyState title="No outline yet" level={3}>
          Draw one with the tools on the left, or bring in a drawing.
        </EmptyState>
      ) : null}
      <ul>
        {job.outlines.map(({ id, name, face, shape }) => {
          const count = job.cuts.filter(({ outlines }) => outlines.includes(id)).length;
          const isSelected = selected.includes(id);
          return (
            <li key={id} className="border-b border-rule">
              <button
                type="button"
                aria-pressed={isSelected}
                className={classNames(
                  'flex min-h-10 w-full items-center gap-2 px-1 text-left touch:min-h-touch',
                  isSelected && 'bg-select',
                )}
                onClick={(event) => {
                  const both = event.shiftKey || event.ctrlKey || event.metaKey;
                  editor.select(both ? { outlines: toggled(selected, id) } : { outlines: [id], cut: null });
                }}
              >
                {isSelected ? <Icon name="check" size={16} /> : null}
                <span className="grow">{name || id}</span>
                <span className="text-sm text-graphite">
                  {shape.type}, {count === 1 ? '1 cut' : `${count} cuts`}
                </span>
                <Tag>{face}</Tag>
              </button>
            </li>
          );
        })}
      </ul>
    </div>
  );
}

function toggled(ids: readonly string[], id: string): readonly string[] {
  return ids.includes(id) ? ids.filter((other) => other !== id) : [...ids, id];
}
