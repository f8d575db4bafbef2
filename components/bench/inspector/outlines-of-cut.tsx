'use client';

import { Button, IconButton } from '@/components/ui/button';
import type { Cut } from '@/lib/job/cut-schema';
import type { Job } from '@/lib/job/job-schema';
import { useBench, useEditorState } from '../bench-context';
import { useSetCutField } from './field-of-cut';

/** Which outlines a cut follows; what is selected can be added, all but the last taken out. */
export function OutlinesOfCut({ job, cut }: { job: Job; cut: Cut }) {
  const { editor, readOnly } = useBench();
  const set = useSetCutField(job, cut, 'outlines');
  const selected = useEditorState(({ session }) => session.selection.outlines);
  const names = new Map(job.outlines.map(({ id, name }) => [id, name || id]));
  const addable = selected.filter((id) => !cut.outlines.includes(id));
  return (
    <section className="grid gap-1" aria-label="Outlines of the cut">
      <h3 className="text-lg">Outlines</h3>
      {cut.outlines.length === 0 ? <p className="text-graphite">The whole board.</p> : null}
      <ul className="grid">
        {cut.outlines.map((id) => (
          <li key={id} className="flex items-center gap-2 border-b border-rule">
            <button
              type="button"
              className="min-h-9 grow text-left touch:min-h-touch"
              onClick={() => editor.select({ outlines: [id] })}
            >
              {names.get(id)}
            </button>
            {!readOnly && cut.outlines.length > 1 ? (
              <IconButton
                size="small"
                icon="close"
                label={`Take ${names.get(id) ?? id} out of this cut`}
                onClick={() =>
                  set(
                    'outlines',
                    cut.outlines.filter((other) => other !== id),
                  )
                }
              />
            ) : null}
          </li>
        ))}
      </ul>
      {!readOnly && addable.length > 0 ? (
        <Button size="small" icon="plus" onClick={() => set('outlines', [...cut.outlines, ...addable])}>
          {addable.length === 1
            ? `Cut ${names.get(addable[0] ?? '')} too`
            : `Cut ${addable.length} selected outlines too`}
        </Button>
      ) : null}
    </section>
  );
}
