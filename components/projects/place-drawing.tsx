'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Choice } from '@/components/ui/choice';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import type { Result } from '@/lib/base/result';
import { sentenceOf } from '@/lib/client/api-error';
import { useCreateWithOutlines } from '@/lib/client/use-create-with-outlines';
import { plainName } from '@/lib/contracts/account';
import type { Project } from '@/lib/contracts/project';
import { boardFieldsIn, BoardFields, readBoard, type BoardSize } from './board-fields';
import { lengthText } from './board-size';
import { MARGIN, type Drawing, type Placing } from './drawing';
import { LeftOut } from './left-out';
import { LengthField, positiveLength } from './length-field';

type Unit = 'mm' | 'in';

interface PlaceDrawingProps {
  readonly name: string;
  /** As large as the file says. */
  readonly drawing: Drawing;
  readonly place: (placing: Placing) => Result<Drawing, string>;
  readonly onMade: (project: Project) => void;
  readonly onBack: () => void;
}

const THICKNESS = 18;

/** ‘This large?’: shows the size found, takes another, and proposes a board with a margin all round. */
export function PlaceDrawing({ name: fileName, drawing, place, onMade, onBack }: PlaceDrawingProps) {
  const [name, setName] = useState(fileName);
  const [unit, setUnit] = useState<Unit>('mm');
  const [width, setWidth] = useState(lengthText(drawing.size.width, 'mm'));
  const [board, setBoard] = useState(boardFieldsIn('mm', boardFor(drawing, 1)));
  const [checked, setChecked] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);
  const create = useCreateWithOutlines();
  const named = plainName.safeParse(name);

  const wanted = positiveLength(width, unit);
  const scale = wanted.ok ? wanted.value / drawing.size.width : 1;

  function changeWidth(text: string) {
    setWidth(text);
    const length = positiveLength(text, unit);
    const thickness = readBoard(board, unit)?.z ?? THICKNESS;
    if (length.ok)
      setBoard(boardFieldsIn(unit, boardFor(drawing, length.value / drawing.size.width, thickness)));
  }

  function changeUnit(next: Unit) {
    setUnit(next);
    if (wanted.ok) setWidth(lengthText(wanted.value, next));
    setBoard(boardFieldsIn(next, readBoard(board, unit) ?? boardFor(drawing, scale)));
  }

  function submit(event: FormEvent) {
    event.preventDefault();
    setChecked(true);
    setRefusal(null);
    const size = readBoard(board, unit);
    if (!named.success || !size || !wanted.ok) return;
    const placed = place({
      scale,
      at: { x: (size.x - wanted.value) / 2, y: (size.y - drawing.size.height * scale) / 2 },
    });
    if (!placed.ok) {
      setRefusal(placed.error);
      return;
    }
    const outlines = placed.value.outlines;
    create.mutate({ name: named.data, board: size, display: unit, outlines }, { onSuccess: onMade });
  }

  const trouble = refusal ?? (create.error ? sentenceOf(create.error) : null);
  return (
    <form noValidate onSubmit={submit} className="grid gap-4">
      {trouble ? <Notice kind="error">{trouble}</Notice> : null}
      <div className="flex flex-wrap items-end justify-between gap-3">
        <p>
          <span className="font-heading text-xl font-semibold">This large?</span>{' '}
          <span className="figure">
            {lengthText(drawing.size.width * scale, unit)} × {lengthText(drawing.size.height * scale, unit)}{' '}
            {unit}
          </span>
        </p>
        <Choice
          label="Unit"
          value={unit}
          onChange={changeUnit}
          options={[
            { value: 'mm', label: 'mm' },
            { value: 'in', label: 'inches' },
          ]}
        />
      </div>
      <LengthField
        label="Width of the drawing"
        text={width}
        unit={unit}
        checked={checked}
        onChange={changeWidth}
      />
      <TextField
        label="Name of the project"
        value={name}
        onChange={({ target }) => setName(target.value)}
        autoComplete="off"
        {...(checked && !named.success ? { error: 'Give it a name of 1 to 80 characters.' } : {})}
      />
      <p className="font-medium">The board</p>
      <BoardFields fields={board} unit={unit} checked={checked} onChange={setBoard} />
      <LeftOut drawing={drawing} />
      <div className="flex flex-wrap justify-end gap-2">
        <Button onClick={onBack}>Another file</Button>
        <Button type="submit" variant="primary" busy={create.isPending || create.isSuccess}>
          Make the project
        </Button>
      </div>
    </form>
  );
}

/** A board with a margin round the drawing, in whole mm. */
function boardFor({ size }: Drawing, scale: number, z = THICKNESS): BoardSize {
  const round = (length: number) => Math.ceil(length * scale + 2 * MARGIN);
  return { x: round(size.width), y: round(size.height), z };
}
