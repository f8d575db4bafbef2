'use client';

import { TextField } from '@/components/ui/field';
import { SelectField } from '@/components/ui/select';
import { checkedJob } from '@/lib/editor/edits/edit-cuts';
import type { Corner } from '@/lib/job/board-schema';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import { turnCorner } from '@/lib/job/turn';
import { useBench } from '../bench-context';
import { LengthField } from '../length-field';
import { CuttersOfJob } from './cutters-of-job';

/** The board, how it is turned over and zeroed, and the machine that cuts it. */
export function BoardInspector({ job }: { job: Job }) {
  return (
    <div className="grid gap-5">
      <BoardFields job={job} />
      <TurnFields job={job} />
      <MachineFields job={job} />
      <CuttersOfJob job={job} />
    </div>
  );
}

/** Applies a changed document as a named step, or gives the sentence where it would not be right. */
function useApplyJob(): (label: string, job: Job) => string | null {
  const { editor } = useBench();
  return (label, job) => {
    const checked = checkedJob(job);
    if (!checked.ok) return checked.error;
    editor.apply(label, checked.value);
    return null;
  };
}

function BoardFields({ job }: { job: Job }) {
  const { readOnly } = useBench();
  const apply = useApplyJob();
  const { board } = job;
  const sizes = [
    ['x', 'Length'],
    ['y', 'Width'],
    ['z', 'Thickness'],
  ] as const;
  return (
    <section className="grid gap-2" aria-labelledby="board-heading">
      <h3 id="board-heading" className="text-lg">
        Board
      </h3>
      {sizes.map(([key, label]) => (
        <LengthField
          key={key}
          label={label}
          value={board[key]}
          unit={job.display}
          disabled={readOnly}
          onCommit={(value) =>
            apply(`Change ${label.toLowerCase()} of the board`, { ...job, board: { ...board, [key]: value } })
          }
        />
      ))}
      <TextField
        layout="row"
        label="Material"
        key={board.material}
        defaultValue={board.material}
        maxLength={80}
        readOnly={readOnly}
        onBlur={(event) =>
          event.currentTarget.value !== board.material &&
          apply('Change material', { ...job, board: { ...board, material: event.currentTarget.value } })
        }
      />
      <SelectField
        layout="row"
        label="Grain runs"
        value={board.grain}
        disabled={readOnly}
        onChange={(event) =>
          apply('Change grain', {
            ...job,
            board: { ...board, grain: event.currentTarget.value === 'y' ? 'y' : 'x' },
          })
        }
      >
        <option value="x">along the length (x)</option>
        <option value="y">along the width (y)</option>
      </SelectField>
      <SelectField
        layout="row"
        label="Shown in"
        value={job.display}
        disabled={readOnly}
        onChange={(event) =>
          apply('Change units', { ...job, display: event.currentTarget.value === 'in' ? 'in' : 'mm' })
        }
      >
        <option value="mm">millimetres</option>
        <option value="in">inches</option>
      </SelectField>
    </section>
  );
}

const CORNERS: readonly { value: Corner; label: string }[] = [
  { value: 'front-left', label: 'front left' },
  { value: 'front-right', label: 'front right' },
  { value: 'back-left', label: 'back left' },
  { value: 'back-right', label: 'back right' },
  { value: 'center', label: 'centre' },
];

function TurnFields({ job }: { job: Job }) {
  const { readOnly } = useBench();
  const apply = useApplyJob();
  return (
    <section className="grid gap-2" aria-labelledby="turn-heading">
      <h3 id="turn-heading" className="text-lg">
        Faces and zeros
      </h3>
      <SelectField
        layout="row"
        label="Cut"
        value={job.order.join('')}
        disabled={readOnly}
        onChange={(event) => apply('Change order of faces', withOrder(job, event.currentTarget.value))}
      >
        <option value="A">face A only</option>
        <option value="B">face B only</option>
        <option value="BA">B first, then A</option>
        <option value="AB">A first, then B</option>
      </SelectField>
      <SelectField
        layout="row"
        label="Turned over"
        value={job.turn.axis}
        disabled={readOnly}
        onChange={(event) =>
          apply('Change turn', { ...job, turn: { axis: event.currentTarget.value === 'y' ? 'y' : 'x' } })
        }
      >
        <option value="x">about x, towards you</option>
        <option value="y">about y, like a page</option>
      </SelectField>
      {job.order.map((face) => (
        <ZeroFields key={face} job={job} face={face} />
      ))}
    </section>
  );
}

function ZeroFields({ job, face }: { job: Job; face: Face }) {
  const { readOnly } = useBench();
  const apply = useApplyJob();
  const setup = job.setups[face];
  if (!setup) return null;
  const withZero = (zero: Partial<typeof setup.zero>): Job => ({
    ...job,
    setups: { ...job.setups, [face]: { ...setup, zero: { ...setup.zero, ...zero } } },
  });
  return (
    <>
      <SelectField
        layout="row"
        label={`Zero of ${face}`}
        value={setup.zero.corner}
        disabled={readOnly}
        onChange={(event) =>
          apply(`Move zero of face ${face}`, withZero({ corner: event.currentTarget.value as Corner }))
        }
      >
        {CORNERS.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </SelectField>
      <SelectField
        layout="row"
        label={`Z0 of ${face}`}
        value={setup.zero.z}
        disabled={readOnly}
        onChange={(event) =>
          apply(
            `Change Z zero of face ${face}`,
            withZero({ z: event.currentTarget.value === 'bed' ? 'bed' : 'surface' }),
          )
        }
      >
        <option value="surface">on the face</option>
        <option value="bed">on the spoilboard</option>
      </SelectField>
    </>
  );
}

/** The order of faces, with a set-up for each; a new one is zeroed on the other's physical corner. */
function withOrder(job: Job, order: string): Job {
  const faces = [...order].map((face): Face => (face === 'B' ? 'B' : 'A'));
  const setups = { ...job.setups };
  for (const face of faces) {
    const other = setups[face === 'A' ? 'B' : 'A'];
    setups[face] ??= {
      zero: other
        ? { corner: turnCorner(job.turn.axis, other.zero.corner), z: other.zero.z }
        : { corner: 'front-left', z: 'surface' },
      clamps: [],
    };
  }
  return { ...job, order: faces, setups };
}

const DIALECTS = [
  ['grbl', 'Grbl'],
  ['linuxcnc', 'LinuxCNC'],
  ['iso', 'plain ISO 6983'],
] as const;

function MachineFields({ job }: { job: Job }) {
  const { readOnly } = useBench();
  const apply = useApplyJob();
  const { machine } = job;
  const { controller } = machine;
  const withController = (change: Partial<typeof controller>): Job => ({
    ...job,
    machine: { ...machine, controller: { ...controller, ...change } },
  });
  return (
    <section className="grid gap-2" aria-labelledby="machine-heading">
      <h3 id="machine-heading" className="text-lg">
        Machine
      </h3>
      <p className="text-graphite">
        {machine.name}: travel {machine.travel.x} × {machine.travel.y} × {machine.travel.z} mm
      </p>
      <SelectField
        layout="row"
        label="Controller"
        value={controller.dialect}
        disabled={readOnly}
        onChange={(event) => {
          const dialect = DIALECTS.find(([value]) => value === event.currentTarget.value)?.[0];
          if (dialect) apply('Change controller', withController({ dialect }));
        }}
      >
        {DIALECTS.map(([value, label]) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </SelectField>
      <SelectField
        layout="row"
        label="Programs in"
        value={controller.units}
        disabled={readOnly}
        onChange={(event) =>
          apply(
            'Change units of programs',
            withDecimals(withController({ units: event.currentTarget.value === 'in' ? 'in' : 'mm' })),
          )
        }
      >
        <option value="mm">millimetres (G21)</option>
        <option value="in">inches (G20)</option>
      </SelectField>
      <LengthField
        label="Clearance"
        value={machine.clearance}
        unit={job.display}
        hint="Height above the face at which the cutter travels."
        disabled={readOnly}
        onCommit={(value) =>
          apply('Change clearance', { ...job, machine: { ...machine, clearance: Number(value) } })
        }
      />
    </section>
  );
}

/** The unit's own number of decimals holds again. */
function withDecimals(job: Job): Job {
  const { decimals: _dropped, ...controller } = job.machine.controller;
  return { ...job, machine: { ...job.machine, controller } };
}
