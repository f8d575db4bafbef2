import { DEGREES } from '@/lib/geometry/vec';
import { cutterById } from '@/lib/job/cut-values';
import type { Job } from '@/lib/job/job-schema';
import { turnPoint } from '@/lib/job/turn';
import type { TabPlace } from '@/lib/report/intent';
import type { FaceName } from '@/lib/report/report';
import { cutterShape } from './cutter-shape';
import { createHeightField, type HeightField } from './height-field';
import { motionStops, placeMotion, type Motion, type MotionPoint } from './motion';
import type { ReadIntent } from './read-intent';
import { Sweeper } from './sweep';

/** Wood of a tab: from its lowest to its highest at the weakest place, mm, and its least section, mm². */
export interface TabWood {
  readonly height: number;
  readonly area: number;
}

/** Widest cells of the fine sweep along the tab and across its kerf, where a far groove's tip must not be missed, mm. */
const ALONG = 0.05;
const ACROSS = 0.01;
/** Chords of arcs lie this near to them in the fine sweep, mm. */
const CHORD = 0.001;
/** The height is that of the tab's middle: on a bend the square ends of its wood lean over the outer shares. */
const CORE = 0.7;
/** Cells this near to the kerf's wall are not asked, mm: there the wood of part and frame begins. */
const WALL = 0.1;

/**
 * What is left of a tab once everything is cut, by a fine sweep of its surroundings: own face, far face and every cut on
 * either, whichever comes first. The least section follows, cell by cell along the tab, the place across the kerf where
 * the wood is thinnest; no way from part to frame crosses less.
 */
export function measureTabWood(job: Job, programs: readonly ReadIntent[], tab: TabPlace): TabWood {
  const cut = job.cuts.find(({ id }) => id === tab.cut);
  if (!cut) throw new Error(`No cut '${tab.cut}'`);
  const radius = cutterById(job, cut.cutter).diameter / 2;
  const fall = tab.slope >= 90 ? 0 : tab.height / Math.tan(tab.slope * DEGREES);
  const reach = tab.length / 2 + fall;
  const half = Math.max(ACROSS, radius - WALL);
  const box = { x: -reach, y: -half, width: 2 * reach, height: 2 * half };
  const fields = { A: createHeightField(box, ALONG, ACROSS), B: createHeightField(box, ALONG, ACROSS) };
  for (const program of programs) sweepNear(job, program, tab, cut.face, box, fields[program.intent.face]);
  const own = fields[cut.face];
  const far = fields[cut.face === 'A' ? 'B' : 'A'];
  return weakest(own, far, tab, { thickness: job.board.z, fall });
}

function weakest(
  own: HeightField,
  far: HeightField,
  tab: TabPlace,
  { thickness, fall }: { thickness: number; fall: number },
): TabWood {
  let area = 0;
  let height = Infinity;
  for (let column = 0; column < own.columns; column++) {
    const along = Math.abs(own.x + (column + 0.5) * own.stepX);
    const beyond = Math.max(0, along - tab.length / 2);
    // Beyond the tab's own slope the wood is the round that the cutter leaves: it is not counted on.
    const prism = beyond > 0 && fall > 0 ? tab.height * (1 - beyond / fall) : tab.height;
    let least = Infinity;
    for (let row = 0; row < own.rows; row++) {
      const cell = row * own.columns + column;
      const top = Math.min(thickness + own.z[cell]!, Math.max(prism, 0));
      least = Math.min(least, Math.max(0, top + far.z[cell]!));
    }
    area += least * own.stepX;
    if (along <= (CORE * tab.length) / 2) height = Math.min(height, least);
  }
  return { height: Number.isFinite(height) ? height : 0, area };
}

/** Sweeps what comes near the tab in the tab's own frame: x along the kerf, y across it. */
function sweepNear(
  job: Job,
  { intent, steps }: ReadIntent,
  tab: TabPlace,
  tabFace: FaceName,
  box: { x: number; y: number; width: number; height: number },
  field: HeightField,
): void {
  const turned = intent.face !== tabFace;
  const [ax, ay] = tab.along;
  const [cx, cy] = tab.center;
  const place = (p: MotionPoint): MotionPoint => {
    const { x, y } = turned ? turnPoint(job.board, job.turn.axis, p) : p;
    return { x: (x - cx) * ax + (y - cy) * ay, y: (y - cy) * ax - (x - cx) * ay, z: p.z };
  };
  for (const step of steps) {
    if (step.kind !== 'motion' || step.cutter === null || Math.min(step.from.z, step.to.z) >= 0) continue;
    const shape = cutterShape(cutterById(job, step.cutter));
    const motion = placeMotion(step, place, turned);
    if (!comesNear(motion, box, shape.radius)) continue;
    const sweeper = new Sweeper(field, shape);
    sweeper.moveTo(motion.from);
    for (const p of motionStops(motion, CHORD)) sweeper.lineTo(p);
    sweeper.finish();
  }
}

function comesNear(
  { from, to, arc }: Motion,
  box: { x: number; y: number; width: number; height: number },
  radius: number,
): boolean {
  const bow = arc ? 2 * Math.hypot(from.x - arc.x, from.y - arc.y) : 0;
  return (
    Math.max(from.x, to.x) + radius + bow >= box.x &&
    Math.min(from.x, to.x) - radius - bow <= box.x + box.width &&
    Math.max(from.y, to.y) + radius + bow >= box.y &&
    Math.min(from.y, to.y) - radius - bow <= box.y + box.height
  );
}
