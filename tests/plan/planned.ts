import type { Contour } from '@/lib/geometry/contour';
import { distance, type Vec } from '@/lib/geometry/vec';
import type { Cut } from '@/lib/job/cut-schema';
import type { Job, JobInput } from '@/lib/job/job-schema';
import type { Cutter } from '@/lib/job/machine-schema';
import { parseJob } from '@/lib/job/parse-job';
import { resolveJob } from '@/lib/job/resolve-job';
import type { CutMoves } from '@/lib/moves/cut-moves';
import type { Position } from '@/lib/moves/move';
import { resolveOutlines, type ResolvedOutlines } from '@/lib/outline/resolve-outlines';
import { planCuts, type PlannedCuts } from '@/lib/plan/plan-cuts';
import { sampleJob } from '../helpers/sample-job';

export type OutlineInput = JobInput['outlines'][number];
export type CutInput = JobInput['cuts'][number];

export interface Planned extends PlannedCuts {
  readonly job: Job;
  readonly outlines: ResolvedOutlines;
}

/** Plans cuts on a 200 × 100 × 18 board with the sample job's machine and cutters and whatever is changed. */
export function plan(outlines: OutlineInput[], cuts: CutInput[], change: Partial<JobInput> = {}): Planned {
  const parsed = parseJob({ ...sampleJob(), outlines, cuts, ...change });
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.error));
  const job = resolveJob(parsed.value);
  const resolved = resolveOutlines(job, new Map());
  if (!resolved.ok) throw new Error(JSON.stringify(resolved.error));
  return { job, outlines: resolved.value, ...planCuts(job, resolved.value) };
}

export function stepOf(planned: Planned, cut: string): CutMoves {
  const step = planned.steps.find((candidate) => candidate.cut === cut);
  if (!step) throw new Error(`No moves for ${cut}`);
  return step;
}

export interface Sample extends Position {
  readonly rapid: boolean;
}

/** Places along all moves, at most `step` apart, arcs by their own angle. */
export function samples({ moves }: CutMoves, step = 0.1): Sample[] {
  const out: Sample[] = [];
  let at: Position | null = null;
  for (const move of moves) {
    if (move.kind === 'dwell') continue;
    const from: Position = at ?? move.to;
    const place = move.kind === 'arc' ? arcPlace(from, move) : linePlace(from, move.to);
    const count = Math.max(1, Math.ceil(place.length / step));
    for (let i = 1; i <= count; i++) out.push({ ...place.at(i / count), rapid: move.kind === 'rapid' });
    at = move.to;
  }
  return out;
}

function linePlace(a: Position, b: Position) {
  return {
    length: Math.hypot(b.x - a.x, b.y - a.y, b.z - a.z),
    at: (t: number) => ({ x: a.x + (b.x - a.x) * t, y: a.y + (b.y - a.y) * t, z: a.z + (b.z - a.z) * t }),
  };
}

function arcPlace(a: Position, move: { to: Position; cx: number; cy: number; ccw: boolean }) {
  const radius = Math.hypot(a.x - move.cx, a.y - move.cy);
  const start = Math.atan2(a.y - move.cy, a.x - move.cx);
  let sweep = Math.atan2(move.to.y - move.cy, move.to.x - move.cx) - start;
  if (move.ccw && sweep <= 1e-9) sweep += 2 * Math.PI;
  if (!move.ccw && sweep >= -1e-9) sweep -= 2 * Math.PI;
  return {
    length: radius * Math.abs(sweep),
    at: (t: number) => ({
      x: move.cx + radius * Math.cos(start + sweep * t),
      y: move.cy + radius * Math.sin(start + sweep * t),
      z: a.z + (move.to.z - a.z) * t,
    }),
  };
}

/** Distance to a contour by plain sampling of its lines and arcs: slow, simple, independent of the product's own. */
export function distanceToPoints(points: readonly Vec[], p: Vec): number {
  let least = Infinity;
  points.forEach((a, i) => {
    const b = points[(i + 1) % points.length]!;
    const size = distance(a, b) ** 2;
    const t =
      size > 0 ? Math.max(0, Math.min(1, ((p.x - a.x) * (b.x - a.x) + (p.y - a.y) * (b.y - a.y)) / size)) : 0;
    least = Math.min(least, distance(p, { x: a.x + (b.x - a.x) * t, y: a.y + (b.y - a.y) * t }));
  });
  return least;
}

/** Even-odd test by counting crossings to the right. */
export function inside(points: readonly Vec[], p: Vec): boolean {
  let odd = false;
  points.forEach((a, i) => {
    const b = points[(i + 1) % points.length]!;
    if (a.y > p.y !== b.y > p.y && p.x < a.x + ((b.x - a.x) * (p.y - a.y)) / (b.y - a.y)) odd = !odd;
  });
  return odd;
}

/** How high a cutter's edge stands over its point at a distance from the axis; infinite beyond it. */
export function rise(cutter: Cutter, away: number): number {
  if (away > cutter.diameter / 2) return Infinity;
  if (cutter.kind !== 'vbit') return 0;
  return Math.max(0, away - cutter.tip / 2) / Math.tan((cutter.angle * Math.PI) / 360);
}

/** Height of the wood at a place after a cut: the lowest that any sampled position of the cutter leaves, at most 0. */
export function woodAt(path: readonly Sample[], cutter: Cutter, p: Vec): number {
  let low = 0;
  for (const sample of path) {
    if (sample.z >= low) continue;
    const away = distance(sample, p);
    low = Math.min(low, sample.z + rise(cutter, away));
  }
  return low;
}

export function cutterOfCut(job: Job, cut: Pick<Cut, 'cutter'>): Cutter {
  return job.cutters.find(({ id }) => id === cut.cutter)!;
}

/** Points of straight-sided contours: their corners. */
export function cornersOf({ start, segments }: Contour): Vec[] {
  return [start, ...segments.map(({ to }) => to)].slice(0, -1);
}

export function rect(
  id: string,
  x: number,
  y: number,
  width: number,
  height: number,
  face: 'A' | 'B' = 'A',
): OutlineInput {
  return { id, face, shape: { type: 'rect', x, y, width, height } };
}

export function path(id: string, d: string, face: 'A' | 'B' = 'A'): OutlineInput {
  return { id, face, shape: { type: 'path', d } };
}

/** No rapid moves level or down below the face; every rapid that travels does so at the clearance. */
export function rapidsBelow(planned: Planned): number {
  const { clearance, approach } = planned.job.machine;
  let count = 0;
  for (const { moves } of planned.steps) {
    let at: Position | null = null;
    for (const move of moves) {
      if (move.kind === 'dwell') continue;
      if (move.kind === 'rapid' && at) {
        const travels = Math.hypot(move.to.x - at.x, move.to.y - at.y) > 1e-6;
        if (travels && Math.min(at.z, move.to.z) < clearance - 1e-9) count++;
        if (!travels && move.to.z < at.z && move.to.z < approach - 1e-9) count++;
      }
      at = move.to;
    }
  }
  return count;
}
