import { SAME_POINT } from '@/lib/base/tolerances';
import type { Ring } from './contour';
import { cross, distance, dot, type Vec } from './vec';

export interface OffsetOptions {
  /** What a corner that opens becomes; `sharp` corners longer than {@link MITRE_LIMIT} offsets are rounded all the same. */
  readonly corners?: 'round' | 'sharp';
  /** Greatest error of the arcs, mm. */
  readonly tolerance?: number;
}

const DEFAULT_TOLERANCE = 0.0025;
/** Reach of a sharp corner in offsets; an angle of 23° has about this. */
const MITRE_LIMIT = 5;

/**
 * Each edge of a ring moved out by `delta` (to the right of its direction: out of a counter-clockwise ring), joined by
 * arcs or mitres where the corner opens and by a straight line where it closes. The curve crosses itself there; filling
 * it where its winding is positive leaves the true offset, since the crossed loops wind the other way outside and twice
 * inside.
 *
 * Where an edge is too short to be left over between its two joints, the curve goes back through the source's corners:
 * its winding is then one less for each edge's strip that covers a point, and a ring that collapses does not come out
 * turned inside out. Going back everywhere would be right as well, but makes the clipper's work several times as much.
 */
export function offsetRing(ring: Ring, delta: number, options: OffsetOptions): Vec[] {
  const points = withoutDoubles(ring);
  const count = points.length;
  if (count < 2) return [];
  const full: Required<OffsetOptions> = {
    corners: options.corners ?? 'round',
    tolerance: options.tolerance ?? DEFAULT_TOLERANCE,
  };
  const ways = points.map((point, i) => unit(point, points[(i + 1) % count]!));
  const turns = ways.map((way, i) => turnBetween(ways[(i + count - 1) % count]!, way));
  const lost = points.map((point, i) => {
    const next = (i + 1) % count;
    const taken = closedLength(turns[i]!, delta) + closedLength(turns[next]!, delta);
    return taken >= distance(point, points[next]!);
  });
  const out: Vec[] = [];
  for (let i = 0; i < count; i++) {
    const last = (i + count - 1) % count;
    const joint = { corner: points[i]!, before: ways[last]!, after: ways[i]!, turn: turns[i]! };
    if (opens(joint.turn, delta)) openJoint(out, joint, delta, full);
    else closeJoint(out, joint, delta, lost[last]! || lost[i]!);
  }
  return out;
}

interface Joint {
  readonly corner: Vec;
  readonly before: Vec;
  readonly after: Vec;
  /** Signed radians, positive to the left. */
  readonly turn: number;
}

function turnBetween(before: Vec, after: Vec): number {
  return Math.atan2(cross(before, after), dot(before, after));
}

/** There and straight back counts as a corner that opens outwards. */
function opens(turn: number, delta: number): boolean {
  return isReversal(turn) ? delta > 0 : turn * delta > 0;
}

function isReversal(turn: number): boolean {
  return Math.abs(Math.abs(turn) - Math.PI) < 1e-9;
}

/** By how much a joint that closes shortens each of its edges. */
function closedLength(turn: number, delta: number): number {
  return opens(turn, delta) ? 0 : Math.abs(delta) * Math.tan(Math.min(Math.abs(turn) / 2, 1.57));
}

function closeJoint(
  out: Vec[],
  { corner, before, after, turn }: Joint,
  delta: number,
  goesBack: boolean,
): void {
  if (goesBack) out.push(moved(corner, before, delta), corner, moved(corner, after, delta));
  else if (Math.abs(turn) < 1e-6) out.push(moved(corner, after, delta));
  else out.push(moved(corner, before, delta), moved(corner, after, delta));
}

function openJoint(
  out: Vec[],
  { corner, before, after, turn }: Joint,
  delta: number,
  options: Required<OffsetOptions>,
): void {
  const size = Math.abs(delta);
  const reach = 1 / Math.cos(Math.abs(turn) / 2);
  const isSmooth = size * (reach - 1) <= options.tolerance / 2;
  if (!isReversal(turn) && (isSmooth || (options.corners === 'sharp' && reach <= MITRE_LIMIT))) {
    const x = before.y + after.y;
    const y = -before.x - after.x;
    const scale = (delta * reach) / Math.hypot(x, y);
    out.push({ x: corner.x + x * scale, y: corner.y + y * scale });
    return;
  }
  const sweep = isReversal(turn) ? Math.PI : turn;
  const step = size > options.tolerance ? 2 * Math.acos(1 - options.tolerance / size) : Math.PI / 2;
  const count = Math.max(1, Math.ceil(Math.abs(sweep) / step));
  const start = Math.atan2(-before.x, before.y);
  for (let i = 0; i <= count; i++) {
    const angle = start + (sweep * i) / count;
    out.push({ x: corner.x + delta * Math.cos(angle), y: corner.y + delta * Math.sin(angle) });
  }
}

function moved({ x, y }: Vec, way: Vec, delta: number): Vec {
  return { x: x + delta * way.y, y: y - delta * way.x };
}

function unit(a: Vec, b: Vec): Vec {
  const size = distance(a, b);
  return { x: (b.x - a.x) / size, y: (b.y - a.y) / size };
}

/** Points that fall on their neighbour give no direction. */
function withoutDoubles(ring: Ring): Vec[] {
  const points: Vec[] = [];
  for (const point of ring) {
    const last = points.at(-1);
    if (!last || distance(last, point) > SAME_POINT) points.push(point);
  }
  while (points.length > 1 && distance(points[0]!, points.at(-1)!) <= SAME_POINT) points.pop();
  return points;
}
