import { checkCancelled, type WorkControl } from '@/lib/base/cancel';
import { GOUGE_LIMIT } from '@/lib/base/tolerances';
import { cutterById } from '@/lib/job/cut-values';
import type { Job } from '@/lib/job/job-schema';
import { turnPoint } from '@/lib/job/turn';
import type { FaceName } from '@/lib/report/report';
import { modelPoint, type BoardModel } from './board-model';
import { cutterShape, type CutterShape } from './cutter-shape';
import { cellCentre } from './height-field';
import { motionStops, placeMotion, type Motion, type MotionPoint } from './motion';
import type { ReadIntent, WorkMotion } from './read-intent';
import { Sweeper, type SweepOptions } from './sweep';

/** A rapid that goes through standing wood. */
export interface RapidBite {
  readonly cut: string | null;
  readonly face: FaceName;
  readonly line: number;
  /** How deep into what stood there, mm. */
  readonly depth: number;
  /** In the face's view. */
  readonly at: readonly [number, number];
}

export interface SweepResult {
  /** Wood taken, mm³, by cut. */
  readonly removed: ReadonlyMap<string, number>;
  readonly bites: readonly RapidBite[];
}

/** Chords of arcs lie this near to them, mm. */
const CHORD = 0.002;
/** Steps between two looks at whether somebody gave up. */
const BATCH = 500;

/**
 * Cuts the board by the programs, one after another, in the order given. Rapids take nothing: where one goes through
 * standing wood by more than the gouge limit it is told.
 */
export function sweepPrograms(
  job: Job,
  model: BoardModel,
  programs: readonly ReadIntent[],
  control?: WorkControl,
): SweepResult {
  const removed = new Map<string, number>();
  const bites: RapidBite[] = [];
  const total = programs.reduce((sum, { steps }) => sum + steps.length, 0);
  let done = 0;
  for (const program of programs) {
    const sweep = faceSweep(job, model, program.intent.face);
    for (const step of program.steps) {
      if (done++ % BATCH === 0) {
        checkCancelled(control);
        control?.onProgress?.(done / total, 'Sweeping the programs');
      }
      if (step.kind === 'motion') sweep.step(step, removed, bites);
    }
    sweep.finish(removed);
  }
  return { removed, bites };
}

interface FaceSweep {
  step(motion: WorkMotion, removed: Map<string, number>, bites: RapidBite[]): void;
  finish(removed: Map<string, number>): void;
}

/** The sweep of one program: one running sweeper, ended where cut or cutter change. */
function faceSweep(job: Job, model: BoardModel, face: FaceName): FaceSweep {
  const field = model.fields[face];
  const far = { thickness: model.board.z, z: model.fields[face === 'A' ? 'B' : 'A'].z };
  const turned = face === 'B';
  const place = (p: MotionPoint): MotionPoint =>
    turned ? { ...turnPoint(model.board, model.axis, p), z: p.z } : p;
  let running: { sweeper: Sweeper; cut: string; cutter: string; end: MotionPoint | null } | null = null;

  function finish(removed: Map<string, number>): void {
    if (!running) return;
    running.sweeper.finish();
    const { cut, sweeper } = running;
    removed.set(cut, (removed.get(cut) ?? 0) + sweeper.removed);
    running = null;
  }

  return {
    finish,
    step(motion, removed, bites) {
      const { cut, cutter } = motion;
      if (cutter === null || Math.min(motion.from.z, motion.to.z) >= 0) return;
      const placed = placeMotion(motion, place, turned);
      const shape = cutterShape(cutterById(job, cutter));
      if (motion.rapid) {
        running?.sweeper.finish();
        if (running) running.end = null;
        const bite = biteOf(model, face, motion, placed, { field, shape });
        if (bite) bites.push(bite);
        return;
      }
      if (running?.cut !== cut || running?.cutter !== cutter) {
        finish(removed);
        running = { sweeper: new Sweeper(field, shape, { far }), cut: cut ?? '', cutter, end: null };
      }
      const current = running!;
      const { end, sweeper } = current;
      if (!end || end.x !== placed.from.x || end.y !== placed.from.y || end.z !== placed.from.z)
        sweeper.moveTo(placed.from);
      for (const p of motionStops(placed, CHORD)) sweeper.lineTo(p);
      current.end = placed.to;
    },
  };
}

function biteOf(
  model: BoardModel,
  face: FaceName,
  motion: WorkMotion,
  placed: Motion,
  { field, shape }: { field: BoardModel['fields'][FaceName]; shape: CutterShape },
): RapidBite | null {
  const options: SweepOptions = { probe: true };
  const probe = new Sweeper(field, shape, options);
  probe.moveTo(placed.from);
  probe.lineTo(placed.to);
  probe.finish();
  if (probe.deepest <= GOUGE_LIMIT) return null;
  const { x, y } = modelPoint(model, face, cellCentre(field, probe.deepestCell));
  return { cut: motion.cut, face, line: motion.line, depth: probe.deepest, at: [x, y] };
}
