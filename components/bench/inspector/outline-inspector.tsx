'use client';

import { Button, IconButton } from '@/components/ui/button';
import { TextArea, TextField } from '@/components/ui/field';
import { SelectField } from '@/components/ui/select';
import {
  deleteOutlines,
  duplicateOutlines,
  editShapes,
  renameOutline,
} from '@/lib/editor/edits/edit-outlines';
import { checkedJob } from '@/lib/editor/edits/edit-cuts';
import { addCut, CUT_NAMES, cuttersFor } from '@/lib/editor/edits/new-cut';
import { setShapeFrame, shapeFrame, type Frame } from '@/lib/editor/edits/shape-frame';
import type { CutKind } from '@/lib/job/cut-schema';
import type { Job } from '@/lib/job/job-schema';
import type { Outline, Shape } from '@/lib/job/shape-schema';
import { FONT_CATALOGUE } from '@/lib/outline/font-catalogue';
import { useBench, useEditorState } from '../bench-context';
import { LengthField } from '../length-field';

/** The figures of what is selected, and what can be cut of it. */
export function OutlineInspector({ job, outlines }: { job: Job; outlines: readonly Outline[] }) {
  const { readOnly } = useBench();
  const [only] = outlines;
  return (
    <div className="grid gap-4">
      {outlines.length === 1 && only ? (
        <OutlineName outline={only} job={job} />
      ) : (
        <h2 className="text-xl">{outlines.length} outlines</h2>
      )}
      <FrameFields job={job} outlines={outlines} />
      {outlines.length === 1 && only ? <ShapeFields job={job} outline={only} /> : null}
      {readOnly ? null : <NewCutButtons job={job} outlines={outlines} />}
      <CutsOfOutlines job={job} outlines={outlines} />
      {readOnly ? null : <OutlineActions job={job} outlines={outlines} />}
    </div>
  );
}

function OutlineName({ job, outline }: { job: Job; outline: Outline }) {
  const { editor, readOnly } = useBench();
  return (
    <div>
      <TextField
        label="Name of the outline"
        hideLabel
        key={`${outline.id} ${outline.name}`}
        defaultValue={outline.name || outline.id}
        readOnly={readOnly}
        maxLength={200}
        inputClassName="font-heading text-xl font-semibold"
        onBlur={(event) => {
          const name = event.currentTarget.value.trim();
          if (name !== '' && name !== outline.name)
            editor.apply('Rename outline', renameOutline(job, outline.id, name));
        }}
      />
      <p className="pt-1 text-graphite">
        {outline.shape.type} drawn on face {outline.face}
      </p>
    </div>
  );
}

const FRAME_FIELDS: readonly { key: keyof Frame; label: string; step: string }[] = [
  { key: 'x', label: 'X', step: 'Move' },
  { key: 'y', label: 'Y', step: 'Move' },
  { key: 'width', label: 'Width', step: 'Resize' },
  { key: 'height', label: 'Height', step: 'Resize' },
  { key: 'angle', label: 'Angle', step: 'Turn' },
];

/** X, Y, width, height and angle of each selected outline; a figure in which they differ is shown as such. */
function FrameFields({ job, outlines }: { job: Job; outlines: readonly Outline[] }) {
  const { editor, fonts, readOnly } = useBench();
  const frames = outlines.map(({ shape }) => shapeFrame(shape, fonts));
  const common = (key: keyof Frame): number | null => {
    const values = new Set(frames.map((frame) => frame && Number(frame[key].toFixed(4))));
    const [value] = values;
    return values.size === 1 && value !== undefined ? value : null;
  };
  const commit = (key: keyof Frame, step: string, value: number | string): string | null => {
    if (typeof value !== 'number') return 'Write a figure.';
    if ((key === 'width' || key === 'height') && value <= 0) return 'Must be above 0.';
    const ids = outlines.map(({ id }) => id);
    const next = checkedJob(
      editShapes(job, ids, ({ shape }) => setShapeFrame(shape, { [key]: value }, fonts)),
    );
    if (!next.ok) return next.error;
    editor.apply(
      outlines.length === 1 ? `${step} outline` : `${step} ${outlines.length} outlines`,
      next.value,
    );
    return null;
  };
  return (
    <section className="grid gap-2" aria-label="Place and size">
      {FRAME_FIELDS.map(({ key, label, step }) => (
        <LengthField
          key={key}
          label={label}
          value={common(key)}
          unit={key === 'angle' ? 'deg' : job.display}
          disabled={readOnly}
          onCommit={(value) => commit(key, step, value)}
        />
      ))}
    </section>
  );
}

/** What only this type of shape has. */
function ShapeFields({ job, outline }: { job: Job; outline: Outline }) {
  const { editor, readOnly } = useBench();
  const { shape } = outline;
  const set = (label: string, next: Shape): string | null => {
    const checked = checkedJob(editShapes(job, [outline.id], () => next));
    if (!checked.ok) return checked.error;
    editor.apply(label, checked.value);
    return null;
  };
  if (shape.type === 'rect') {
    return (
      <LengthField
        label="Corner radius"
        value={shape.radius}
        unit={job.display}
        disabled={readOnly}
        onCommit={(value) =>
          typeof value === 'number' ? set('Change corner radius', { ...shape, radius: value }) : null
        }
      />
    );
  }
  if (shape.type === 'polygon') {
    return (
      <LengthField
        label="Sides"
        value={shape.sides}
        unit="count"
        disabled={readOnly}
        onCommit={(value) =>
          typeof value === 'number' ? set('Change sides', { ...shape, sides: value }) : null
        }
      />
    );
  }
  if (shape.type !== 'text') return null;
  return (
    <section className="grid gap-2" aria-label="Text">
      <TextArea
        label="Text"
        key={shape.text}
        defaultValue={shape.text}
        rows={2}
        readOnly={readOnly}
        maxLength={5000}
        onBlur={(event) => {
          const text = event.currentTarget.value;
          if (text !== '' && text !== shape.text) set('Change text', { ...shape, text });
        }}
      />
      <SelectField
        layout="row"
        label="Font"
        value={shape.font}
        disabled={readOnly}
        onChange={(event) => set('Change font', { ...shape, font: event.currentTarget.value })}
      >
        {FONT_CATALOGUE.map(({ id, name }) => (
          <option key={id} value={id}>
            {id} · {name}
          </option>
        ))}
      </SelectField>
      <LengthField
        label="Size"
        value={shape.size}
        unit={job.display}
        disabled={readOnly}
        onCommit={(value) =>
          typeof value === 'number' ? set('Change size of text', { ...shape, size: value }) : null
        }
      />
    </section>
  );
}

const OFFERED: readonly CutKind[] = [
  'profile',
  'pocket',
  'chamfer',
  'engrave',
  'taper-engrave',
  'drill',
  'bore',
  'surface',
];

/** One press makes a cut of what is selected, with figures that suit the board, on the face that is up. */
function NewCutButtons({ job, outlines }: { job: Job; outlines: readonly Outline[] }) {
  const { editor, say, openPanel } = useBench();
  const face = useEditorState(({ session }) => session.face);
  const make = (kind: CutKind): void => {
    const added = addCut(
      job,
      kind,
      face,
      outlines.map(({ id }) => id),
    );
    if (!added)
      return say(`No cutter of this job can do that: take one from the shop's list on the Board page.`);
    editor.apply(`Add ${CUT_NAMES[kind].toLowerCase()}`, added.job);
    editor.select({ cut: added.id, outlines: [] });
    openPanel('selected');
  };
  return (
    <section aria-label="New cut">
      <h3 className="pb-1 text-lg">Cut it on face {face}</h3>
      <div className="flex flex-wrap gap-2">
        {OFFERED.filter((kind) => cuttersFor(job, kind).length > 0).map((kind) => (
          <Button key={kind} size="small" onClick={() => make(kind)}>
            {CUT_NAMES[kind]}
          </Button>
        ))}
      </div>
    </section>
  );
}

function CutsOfOutlines({ job, outlines }: { job: Job; outlines: readonly Outline[] }) {
  const { editor } = useBench();
  const cuts = job.cuts.filter((cut) => outlines.some(({ id }) => cut.outlines.includes(id)));
  if (cuts.length === 0) return <p className="text-graphite">Nothing is cut of it yet.</p>;
  return (
    <section aria-label="Cuts of this outline">
      <h3 className="text-lg">Its cuts</h3>
      <ul>
        {cuts.map(({ id, name, kind, face }) => (
          <li key={id} className="border-b border-rule">
            <button
              type="button"
              className="flex min-h-9 w-full items-center justify-between gap-2 text-left touch:min-h-touch"
              onClick={() => {
                editor.look({ face });
                editor.select({ cut: id, outlines: [] });
              }}
            >
              <span>{name || CUT_NAMES[kind]}</span>
              <span className="text-graphite">face {face}</span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}

function OutlineActions({ job, outlines }: { job: Job; outlines: readonly Outline[] }) {
  const { editor } = useBench();
  const ids = outlines.map(({ id }) => id);
  const what = outlines.length === 1 ? 'outline' : `${outlines.length} outlines`;
  return (
    <div className="flex flex-wrap gap-2 border-t border-rule pt-3">
      <Button
        size="small"
        icon="copy"
        onClick={() => {
          const copies = duplicateOutlines(job, ids, 10);
          editor.apply(`Duplicate ${what}`, copies.job);
          editor.select({ outlines: copies.ids });
        }}
      >
        Duplicate
      </Button>
      <IconButton
        icon="trash"
        size="small"
        label={`Delete ${what}`}
        onClick={() => editor.apply(`Delete ${what}`, deleteOutlines(job, ids))}
      />
    </div>
  );
}
