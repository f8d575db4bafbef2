import { checkCancelled } from '@/lib/base/cancel';
import { evenOddRegions } from '@/lib/geometry/boolean';
import type { Region } from '@/lib/geometry/contour';
import { regionPieces } from '@/lib/geometry/pieces';
import { orderTour } from '@/lib/geometry/tour';
import { DEGREES } from '@/lib/geometry/vec';
import type { Cutter } from '@/lib/job/machine-schema';
import type { Position } from '@/lib/moves/move';
import type { Finding } from '@/lib/report/report';
import {
  cutFinding,
  cutName,
  figure,
  startPlace,
  type CutPlan,
  type CutStep,
  type CutWork,
} from '../../shared/cut-work';
import { insetRegion } from '../../shared/inset-region';
import { layerDepths } from '../../shared/layers';
import { createMoveWriter, type MoveWriter } from '../../shared/move-writer';
import { clearFloor, floorPasses } from './floor';
import { simplifyPositions } from './simplify-positions';
import { skeletonOf } from './skeleton';
import { strokesWithin, type Stroke } from './strokes';

type TaperWork = CutWork<'taper-engrave'>;

/** Paths in space are thinned by this, mm; with the flattening it stays far below the gouge limit. */
const PATH_TOLERANCE = 0.003;

/** Detail narrower than this is more than any cutter's point can show, mm. */
const FINEST_DETAIL = 0.1;

/** How a V-bit's depth follows the room it has. */
interface Taper {
  /** tan α. */
  readonly slope: number;
  /** Radius of the flat at the point. */
  readonly tip: number;
  /** Room at which the depth limit is reached. */
  readonly limit: number;
  readonly depth: number;
}

/**
 * Engraves an area with a V-bit whose point runs along the area's skeleton at the depth at which the cone just touches
 * both sides, up into sharp corners. Where the limit makes a flat floor the point goes round it at the limit and the
 * floor is cleared, by the `floor` cutter in a step of its own that comes first, and by the V-bit what that leaves.
 */
export function planTaperEngrave(work: TaperWork): CutPlan {
  const { cut, cutter } = work;
  if (cutter.kind !== 'vbit') throw new Error(`A taper-engrave with a ${cutter.kind} cutter`);
  const taper = taperOf(cutter, cut.depth);
  const area = evenOddRegions(work.outlines.map(({ region }) => region));
  const findings = tooFine(work, cutter, area);
  const floor = insetRegion(area, taper.limit);
  const steps: CutStep[] = [];
  const cleared = floor.length > 0 && cut.floor !== null ? clearFloor(work, floor, cut.floor) : null;
  if (cleared) steps.push(...cleared.steps);

  const strokes = regionPieces(area).flatMap((piece) => {
    checkCancelled(work.control);
    return strokesWithin(skeletonOf(piece), taper.limit).map((stroke) =>
      positionsOf(stroke, taper, cut.start),
    );
  });
  const rounds = floor.length > 0 ? floorPasses(work, floor, cleared?.left ?? floor) : [];
  const writer = createMoveWriter(work.limits);
  const deepest =
    cut.start + Math.min(cut.depth, deepestOf(strokes, floor.length > 0 ? cut.depth : 0, cut.start));
  for (const [above, depth] of layerPairs(cut.start, deepest, work.stepdown)) {
    followStrokes(writer, work, [...strokes, ...rounds], above, depth);
  }
  const moves = writer.finish();
  if (moves.length > 0) steps.push({ cutter: cutter.id, moves });
  findings.push(...tooDeep(work, cutter, deepest - cut.start));
  return { steps, tabs: [], findings };
}

function taperOf(cutter: Extract<Cutter, { kind: 'vbit' }>, depth: number): Taper {
  const slope = Math.tan((cutter.angle / 2) * DEGREES);
  const tip = cutter.tip / 2;
  return { slope, tip, limit: tip + depth * slope, depth };
}

function positionsOf(stroke: Stroke, { slope, tip, depth }: Taper, start: number): Position[] {
  const positions = stroke.map(({ x, y, distance }) => {
    const room = Math.max(0, distance - tip);
    return { x, y, z: -(start + Math.min(depth, room / slope)) };
  });
  return simplifyPositions(positions, PATH_TOLERANCE);
}

function deepestOf(strokes: readonly Position[][], floor: number, start: number): number {
  return strokes.reduce((most, stroke) => stroke.reduce((m, { z }) => Math.max(m, -z - start), most), floor);
}

/** Pairs of where a layer begins and ends. */
function layerPairs(start: number, deepest: number, stepdown: number): [number, number][] {
  if (deepest <= start) return [];
  const depths = layerDepths(start, deepest, stepdown);
  return depths.map((depth, i) => [i === 0 ? start : depths[i - 1]!, depth]);
}

/** Runs what lies deeper than `above`, no deeper than `depth`, in an order of little travel. */
function followStrokes(
  writer: MoveWriter,
  work: TaperWork,
  strokes: readonly (readonly Position[])[],
  above: number,
  depth: number,
): void {
  const first = above <= work.cut.start;
  const runs = strokes.flatMap((stroke) => (first ? [[...stroke]] : deeperThan(stroke, above)));
  const stops = runs.map((run) => ({ entry: run[0]!, exit: run.at(-1)!, reversible: true }));
  const from = writer.position() ?? startPlace(work);
  for (const { index, reversed } of orderTour(stops, from)) {
    checkCancelled(work.control);
    const run = reversed ? [...runs[index]!].reverse() : runs[index]!;
    const [entry, ...rest] = capped(run, depth);
    const at = writer.position();
    const isThere = at && Math.hypot(at.x - entry!.x, at.y - entry!.y) < 1e-6;
    if (!isThere) writer.travelTo(entry!);
    if (!isThere) writer.descendTo(entry!.z);
    else writer.feedTo(entry!, entry!.z);
    for (const to of rest) writer.feedTo(to, to.z);
  }
}

/** The stretches of a path that lie deeper than `above`, from and to where they cross it. */
function deeperThan(stroke: readonly Position[], above: number): Position[][] {
  const out: Position[][] = [];
  let run: Position[] = [];
  stroke.forEach((p, i) => {
    const before = stroke[i - 1];
    const deep = -p.z > above + 1e-9;
    const wasDeep = before ? -before.z > above + 1e-9 : deep;
    if (before && deep !== wasDeep) run.push(crossingAt(before, p, -above));
    if (deep) run.push(p);
    else if (run.length > 0) {
      out.push(run);
      run = [];
    }
  });
  if (run.length > 0) out.push(run);
  return out.filter((path) => path.length > 1);
}

/** A path held up at `depth`, with points where it crosses it. */
function capped(run: readonly Position[], depth: number): Position[] {
  return run.flatMap((p, i) => {
    const before = run[i - 1];
    const here = { ...p, z: Math.max(p.z, -depth) };
    const crosses = before && before.z > -depth !== p.z > -depth;
    return crosses ? [crossingAt(before, p, -depth), here] : [here];
  });
}

function crossingAt(a: Position, b: Position, z: number): Position {
  const t = (z - a.z) / (b.z - a.z);
  return { x: a.x + (b.x - a.x) * t, y: a.y + (b.y - a.y) * t, z };
}

/** Pieces of the area that are nowhere as wide as the flat at the point, or as any point could show. */
function tooFine(work: TaperWork, cutter: Extract<Cutter, { kind: 'vbit' }>, area: Region): Finding[] {
  const width = Math.max(cutter.tip, FINEST_DETAIL);
  return regionPieces(area)
    .filter((piece) => insetRegion(piece, width / 2).length === 0)
    .map((piece) => {
      const message = `${cutName(work)}: a detail narrower than ${figure(width)} mm is too fine for ${cutter.name}.`;
      return cutFinding(work, 'engrave-too-fine', message, piece[0]?.[0]);
    });
}

/** A cone is only so high: deeper, the widest part of the cutter rubs and the sides stay uncut above it. */
function tooDeep(work: TaperWork, cutter: Extract<Cutter, { kind: 'vbit' }>, depth: number): Finding[] {
  const { slope, tip } = taperOf(cutter, depth);
  const height = (cutter.diameter / 2 - tip) / slope;
  if (depth <= height + 1e-6) return [];
  const message =
    `${cutName(work)} goes ${figure(depth)} mm deep; the cone of ${cutter.name} is ${figure(height)} mm high. ` +
    'Limit the depth or choose a wider V-bit.';
  return [cutFinding(work, 'cutter-too-small', message, work.outlines[0]?.contours[0]?.start)];
}
