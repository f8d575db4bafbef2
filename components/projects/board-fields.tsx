'use client';

import { lengthText } from './board-size';
import { LengthField, positiveLength } from './length-field';

type Unit = 'mm' | 'in';

export interface BoardSize {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

/** What is typed for the three lengths. */
export type BoardTexts = Readonly<Record<keyof BoardSize, string>>;

interface BoardFieldsProps {
  readonly fields: BoardTexts;
  readonly unit: Unit;
  readonly checked: boolean;
  readonly onChange: (fields: BoardTexts) => void;
}

const labels = [
  ['x', 'Length'],
  ['y', 'Width'],
  ['z', 'Thickness'],
] as const;

/** The board's length, width and thickness. */
export function BoardFields({ fields, unit, checked, onChange }: BoardFieldsProps) {
  return (
    <div className="grid gap-2">
      <div className="grid items-start gap-3 sm:grid-cols-3">
        {labels.map(([key, label]) => (
          <LengthField
            key={key}
            label={label}
            text={fields[key]}
            unit={unit}
            checked={checked}
            onChange={(text) => onChange({ ...fields, [key]: text })}
          />
        ))}
      </div>
      <p className="text-sm text-graphite">
        Units and sums may be typed: <span className="figure">1 1/2 in</span>,{' '}
        <span className="figure">480 + 2*10</span>, <span className="figure">6,35</span>.
      </p>
    </div>
  );
}

const usual: Readonly<Record<Unit, BoardTexts>> = {
  mm: { x: '300', y: '200', z: '18' },
  in: { x: '12', y: '8', z: '3/4' },
};

/** The fields' text for a board in mm; without one, a common board of that unit. */
export function boardFieldsIn(unit: Unit, board?: BoardSize): BoardTexts {
  if (!board) return usual[unit];
  return { x: lengthText(board.x, unit), y: lengthText(board.y, unit), z: lengthText(board.z, unit) };
}

/** The board in mm, or null where a field cannot be read. */
export function readBoard(fields: BoardTexts, unit: Unit): BoardSize | null {
  const [x, y, z] = labels.map(([key]) => positiveLength(fields[key], unit));
  return x?.ok && y?.ok && z?.ok ? { x: x.value, y: y.value, z: z.value } : null;
}
