'use client';

import { useState } from 'react';
import { DrawingDrop } from '@/components/projects/drawing-drop';
import { LARGEST_DRAWING, type Drawing } from '@/components/projects/drawing';
import { LeftOut } from '@/components/projects/left-out';
import { readDrawing } from '@/components/projects/read-drawing';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { checkedJob } from '@/lib/editor/edits/edit-cuts';
import { seenJob } from '@/lib/editor/editor-store';
import { placeImported } from '@/lib/editor/edits/import-outlines';
import { lengthWithUnit } from '@/lib/job/format-length';
import { useBench, useEditorState } from '../bench-context';
import { LengthField } from '../length-field';

type Step =
  | { readonly kind: 'choose'; readonly refusal?: string }
  | { readonly kind: 'place'; readonly text: string; readonly drawing: Drawing };

/** Brings a drawing file onto the face that is up: asks whether the size found is meant, says what was left out. */
export function ImportButton() {
  const [open, setOpen] = useState(false);
  const [step, setStep] = useState<Step>({ kind: 'choose' });
  const close = (): void => {
    setOpen(false);
    setStep({ kind: 'choose' });
  };
  return (
    <>
      <Button icon="file" onClick={() => setOpen(true)}>
        Bring in a drawing
      </Button>
      <Dialog
        open={open}
        onOpenChange={(next) => (next ? setOpen(true) : close())}
        title="Bring in a drawing"
        description="An SVG file, as drawing programs save it."
      >
        {step.kind === 'choose' ? (
          <ChooseFile refusal={step.refusal} onStep={setStep} />
        ) : (
          <PlaceOnBoard step={step} onDone={close} />
        )}
      </Dialog>
    </>
  );
}

function ChooseFile({ refusal, onStep }: { refusal: string | undefined; onStep: (step: Step) => void }) {
  const read = async (file: File): Promise<void> => {
    if (file.size > LARGEST_DRAWING)
      return onStep({
        kind: 'choose',
        refusal: 'The file is larger than 10 MB. Save it without pictures and try again.',
      });
    const text = await file.text();
    const drawing = readDrawing(text, { scale: 1, at: { x: 0, y: 0 } });
    onStep(
      drawing.ok
        ? { kind: 'place', text, drawing: drawing.value }
        : { kind: 'choose', refusal: drawing.error },
    );
  };
  return (
    <div className="grid gap-3">
      {refusal ? <Notice kind="error">{refusal}</Notice> : null}
      <DrawingDrop onFile={(file) => void read(file)} />
    </div>
  );
}

function PlaceOnBoard({ step, onDone }: { step: Extract<Step, { kind: 'place' }>; onDone: () => void }) {
  const { editor } = useBench();
  const job = useEditorState(seenJob);
  const face = useEditorState(({ session }) => session.face);
  const { size } = step.drawing;
  const [width, setWidth] = useState(size.width);
  const [refusal, setRefusal] = useState<string | null>(null);
  const scale = size.width > 0 ? width / size.width : 1;
  const height = size.height * scale;
  const fits = width <= job.board.x && height <= job.board.y;
  const place = (): void => {
    const at = { x: (job.board.x - width) / 2, y: (job.board.y - height) / 2 };
    const drawing = readDrawing(step.text, { scale, at });
    if (!drawing.ok) return setRefusal(drawing.error);
    const placed = placeImported(job, face, drawing.value.outlines);
    const checked = checkedJob(placed.job);
    if (!checked.ok) return setRefusal(checked.error);
    editor.apply('Bring in a drawing', checked.value);
    editor.select({ outlines: placed.ids, cut: null });
    onDone();
  };
  return (
    <div className="grid gap-4">
      {refusal ? <Notice kind="error">{refusal}</Notice> : null}
      <p>
        <span className="font-heading text-xl font-semibold">This large?</span>{' '}
        <span className="figure">
          {lengthWithUnit(round(width), job.display)} × {lengthWithUnit(round(height), job.display)}
        </span>
      </p>
      <LengthField
        label="Width"
        value={round(width)}
        unit={job.display}
        onCommit={(value) => {
          if (typeof value !== 'number' || value <= 0) return 'Must be above 0.';
          setWidth(value);
          return null;
        }}
      />
      {fits ? null : <Notice kind="warning">At this size it reaches beyond the board.</Notice>}
      <p>
        {step.drawing.outlines.length === 1 ? 'One outline' : `${step.drawing.outlines.length} outlines`} for
        face {face}, in the middle of the board.
      </p>
      <LeftOut drawing={step.drawing} />
      <div className="flex justify-end">
        <Button variant="primary" onClick={place}>
          Put it on the board
        </Button>
      </div>
    </div>
  );
}

function round(value: number): number {
  return Number(value.toFixed(3));
}
