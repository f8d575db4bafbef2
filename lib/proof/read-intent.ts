import type { Job } from '@/lib/job/job-schema';
import { zeroOf } from '@/lib/job/cut-values';
import { readProgram, type ReadOptions } from '@/lib/gcode/read/read-program';
import type { ProgramIntent } from '@/lib/report/intent';
import type { ProgramReport } from '@/lib/report/report';
import { motionOf, placeMotion, type Motion, type MotionPoint } from './motion';

/** A motion of a program in the view of its face, z against the nominal face, with what it works for. */
export interface WorkMotion extends Motion {
  readonly kind: 'motion';
  readonly cut: string | null;
  readonly cutter: string | null;
}

/** The machine stands still: a dwell, or a stop (of no length that is known) at which it has to come to rest. */
export interface StandStill {
  readonly kind: 'stand';
  readonly seconds: number;
  readonly cut: string | null;
  readonly line: number;
}

export type WorkStep = WorkMotion | StandStill;

/** A program as its text says it, each step known by the cut it works for. */
export interface ReadIntent {
  readonly intent: ProgramIntent;
  readonly steps: readonly WorkStep[];
  readonly lines: number;
  /** Program coordinates, mm; null where nothing moves. */
  readonly bounds: ProgramReport['bounds'] | null;
}

/** Reads a program's text back. Throws the reader's ProgramError where the text is no program. */
export function readIntent(job: Job, intent: ProgramIntent, options: ReadOptions = {}): ReadIntent {
  const zero = zeroOf(job, intent.face);
  const place = (p: MotionPoint) => ({ x: p.x + zero.x, y: p.y + zero.y, z: p.z + zero.z });
  const work = workOfLines(intent);
  const steps: WorkStep[] = [];
  const min: [number, number, number] = [Infinity, Infinity, Infinity];
  const max: [number, number, number] = [-Infinity, -Infinity, -Infinity];
  for (const event of readProgram(intent.text, options)) {
    const { cut, cutter } = work(event.line);
    switch (event.kind) {
      case 'rapid':
      case 'feed':
      case 'arc':
      case 'probe': {
        const motion = motionOf(event);
        widen(min, max, event.to);
        if (!motion) break;
        for (const p of extremes(motion)) widen(min, max, p);
        steps.push({ ...placeMotion(motion, place, false), kind: 'motion', cut, cutter });
        break;
      }
      case 'dwell':
        steps.push({ kind: 'stand', seconds: event.seconds, cut, line: event.line });
        break;
      case 'spindle':
      case 'stop':
      case 'tool':
      case 'end':
        steps.push({ kind: 'stand', seconds: 0, cut, line: event.line });
        break;
      case 'comment':
        break;
    }
  }
  return {
    intent,
    steps: withRetracts(steps),
    lines: countLines(intent.text),
    bounds: Number.isFinite(min[0]) ? { min, max } : null,
  };
}

/** What each line works for; lines come in ascending order. */
function workOfLines({ lineMap }: ProgramIntent): (line: number) => {
  cut: string | null;
  cutter: string | null;
} {
  let index = -1;
  return (line) => {
    while (index + 1 < lineMap.length && lineMap[index + 1]!.line <= line) index++;
    return lineMap[index] ?? { cut: null, cutter: null };
  };
}

/** Rapids straight up that follow a cut belong to the cut that they end, whatever the text's next cut is. */
function withRetracts(steps: readonly WorkStep[]): WorkStep[] {
  let cut: string | null = null;
  let cutter: string | null = null;
  let leaving = true;
  return steps.map((step) => {
    if (step.kind === 'stand') return step;
    if (step.cut !== cut) {
      if (leaving && cut !== null && isRetract(step)) return { ...step, cut, cutter };
      leaving = true;
      cut = step.cut;
      cutter = step.cutter;
    }
    return step;
  });
}

function isRetract({ rapid, from, to }: Motion): boolean {
  return rapid && from.x === to.x && from.y === to.y && to.z >= from.z;
}

/** The ends of a motion and where an arc reaches furthest along the axes. */
function extremes({ from, to, arc }: Motion): MotionPoint[] {
  if (!arc) return [from, to];
  const radius = Math.hypot(from.x - arc.x, from.y - arc.y);
  const start = Math.atan2(from.y - arc.y, from.x - arc.x);
  const [low, high] = arc.sweep > 0 ? [start, start + arc.sweep] : [start + arc.sweep, start];
  const points = [from, to];
  const quarter = Math.PI / 2;
  for (let n = Math.ceil(low / quarter); n * quarter <= high && points.length < 6; n++) {
    const angle = n * quarter;
    points.push({ x: arc.x + radius * Math.cos(angle), y: arc.y + radius * Math.sin(angle), z: from.z });
  }
  return points;
}

function widen(min: [number, number, number], max: [number, number, number], p: MotionPoint): void {
  [p.x, p.y, p.z].forEach((value, axis) => {
    min[axis] = Math.min(min[axis]!, value);
    max[axis] = Math.max(max[axis]!, value);
  });
}

function countLines(text: string): number {
  let count = text.length > 0 && !text.endsWith('\n') ? 1 : 0;
  for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) count++;
  return count;
}
