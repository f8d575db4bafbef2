'use client';

import { useState } from 'react';
import { Notice } from '@/components/ui/notice';
import { Spinner } from '@/components/ui/spinner';
import type { Project } from '@/lib/contracts/project';
import { LARGEST_DRAWING, nameOfFile, type Drawing, type ReadDrawing } from './drawing';
import { DrawingDrop } from './drawing-drop';
import { PlaceDrawing } from './place-drawing';

type Step =
  | { readonly kind: 'choose'; readonly refusal?: string }
  | { readonly kind: 'reading' }
  | { readonly kind: 'place'; readonly name: string; readonly text: string; readonly drawing: Drawing };

interface StartFromFileProps {
  readonly readDrawing: ReadDrawing;
  readonly onMade: (project: Project) => void;
}

/** Reads a drawing, asks how large it is to be, and begins with its outlines on a board that fits. */
export function StartFromFile({ readDrawing, onMade }: StartFromFileProps) {
  const [step, setStep] = useState<Step>({ kind: 'choose' });

  async function read(file: File) {
    if (file.size > LARGEST_DRAWING) {
      setStep({
        kind: 'choose',
        refusal: 'The file is larger than 10 MB. Save it without pictures and try again.',
      });
      return;
    }
    setStep({ kind: 'reading' });
    const text = await file.text();
    const drawing = readDrawing(text, { scale: 1, at: { x: 0, y: 0 } });
    if (!drawing.ok) setStep({ kind: 'choose', refusal: drawing.error });
    else setStep({ kind: 'place', name: nameOfFile(file.name), text, drawing: drawing.value });
  }

  if (step.kind === 'reading') {
    return (
      <p role="status" className="flex items-center gap-3 py-10">
        <Spinner /> Reading the drawing …
      </p>
    );
  }
  if (step.kind === 'place') {
    return (
      <PlaceDrawing
        name={step.name}
        drawing={step.drawing}
        place={(placing) => readDrawing(step.text, placing)}
        onMade={onMade}
        onBack={() => setStep({ kind: 'choose' })}
      />
    );
  }
  return (
    <div className="grid gap-4">
      {step.refusal ? <Notice kind="error">{step.refusal}</Notice> : null}
      <DrawingDrop onFile={(file) => void read(file)} />
    </div>
  );
}
