import { type Box, type Ring } from '@/lib/geometry/contour';
import { distance, DEGREES, dot, scale, subtract, add, cross, type Vec } from '@/lib/geometry/vec';
import { cutterById } from '@/lib/job/cut-values';
import type { Job } from '@/lib/job/job-schema';
import type { Cutter } from '@/lib/job/machine-schema';
import { turnPoint } from '@/lib/job/turn';
import type { CutMoves } from '@/lib/moves/cut-moves';
import type { ArcMove, Position } from '@/lib/moves/move';
import type { FarDepth } from '../shared/cut-work';
import { arcBetween, piecePoints } from '../shared/track';

/** Chords that stand for the far face's arcs lie this near to them, mm. */
const ARC_CHORD = 0.005;

/** A straight stretch that the cutter's point runs below the face, in the view of its own face. */
interface Stretch {
  readonly from: Position;
  readonly to: Position;
  readonly cutter: Cutter;
}

/**
 * What the given moves of one face take away under a ring of the other face's view: the deepest that any part of a
 * cutter goes anywhere within it, mm below the face of the moves. Worked out from the moves themselves, so it holds
 * whatever the reason of a cut is. Along a sloping move its deeper end counts.
 */
export function farDepthOf(job: Job, steps: readonly CutMoves[]): FarDepth {
  const stretches = steps.flatMap((step) => stretchesOf(job, step));
  return (footprint) => {
    const ring = footprint.map((p) => turnPoint(job.board, job.turn.axis, p));
    const box = boxOf(ring);
    return stretches.reduce((deepest, stretch) => {
      const low = Math.min(stretch.from.z, stretch.to.z);
      if (-low <= deepest || !near(stretch, box)) return deepest;
      const away = distanceToRing(stretch, ring);
      if (away >= stretch.cutter.diameter / 2) return deepest;
      return Math.max(deepest, -low - cutterRise(stretch.cutter, away));
    }, 0);
  };
}

/** How high a cutter's edge stands above its lowest point at a distance from its axis, mm. */
export function cutterRise(cutter: Cutter, away: number): number {
  switch (cutter.kind) {
    case 'flat':
      return 0;
    case 'ball': {
      const r = cutter.diameter / 2;
      return r - Math.sqrt(Math.max(0, r * r - away * away));
    }
    case 'vbit':
      return Math.max(0, away - cutter.tip / 2) / Math.tan((cutter.angle / 2) * DEGREES);
    case 'drill':
      return away / Math.tan((cutter.angle / 2) * DEGREES);
  }
}

function stretchesOf(job: Job, { cutter: id, moves }: CutMoves): Stretch[] {
  const cutter = cutterById(job, id);
  const out: Stretch[] = [];
  let at: Position | null = null;
  for (const move of moves) {
    if (move.kind === 'dwell') continue;
    if (at && move.kind !== 'rapid') {
      for (const to of move.kind === 'arc' ? arcStops(at, move) : [move.to]) {
        if (Math.min(at.z, to.z) < 0) out.push({ from: at, to, cutter });
        at = to;
      }
    }
    at = move.to;
  }
  return out;
}

function arcStops(from: Position, { to, cx, cy, ccw }: ArcMove): Position[] {
  const piece = arcBetween(from, to, { x: cx, y: cy }, ccw);
  const points = piecePoints(piece, ARC_CHORD);
  return points.map((p, i) => ({ ...p, z: from.z + ((to.z - from.z) * (i + 1)) / points.length }));
}

function near({ from, to, cutter }: Stretch, box: Box): boolean {
  const r = cutter.diameter / 2;
  return (
    Math.max(from.x, to.x) + r >= box.minX &&
    Math.min(from.x, to.x) - r <= box.maxX &&
    Math.max(from.y, to.y) + r >= box.minY &&
    Math.min(from.y, to.y) - r <= box.maxY
  );
}

function boxOf(ring: Ring): Box {
  const xs = ring.map(({ x }) => x);
  const ys = ring.map(({ y }) => y);
  return { minX: Math.min(...xs), maxX: Math.max(...xs), minY: Math.min(...ys), maxY: Math.max(...ys) };
}

/** Distance of a stretch from a ring's area, 0 where they meet. */
function distanceToRing({ from, to }: Stretch, ring: Ring): number {
  if (insideRing(ring, from) || insideRing(ring, to)) return 0;
  return ring.reduce((least, a, i) => {
    const b = ring[(i + 1) % ring.length]!;
    return Math.min(least, segmentDistance(from, to, a, b));
  }, Infinity);
}

function insideRing(ring: Ring, p: Vec): boolean {
  let inside = false;
  ring.forEach((a, i) => {
    const b = ring[(i + 1) % ring.length]!;
    if (a.y > p.y !== b.y > p.y && p.x < a.x + ((b.x - a.x) * (p.y - a.y)) / (b.y - a.y)) inside = !inside;
  });
  return inside;
}

function segmentDistance(a: Vec, b: Vec, c: Vec, d: Vec): number {
  const side = (p: Vec, q: Vec, r: Vec) => cross(subtract(q, p), subtract(r, p));
  const crosses = side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0;
  if (crosses) return 0;
  return Math.min(
    pointDistance(a, c, d),
    pointDistance(b, c, d),
    pointDistance(c, a, b),
    pointDistance(d, a, b),
  );
}

function pointDistance(p: Vec, a: Vec, b: Vec): number {
  const along = subtract(b, a);
  const size = dot(along, along);
  const t = size > 0 ? Math.min(1, Math.max(0, dot(subtract(p, a), along) / size)) : 0;
  return distance(p, add(a, scale(along, t)));
}
