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
 * inside. Against going back through the source's corner this makes fewer edges for the clipper.
 */
export function offsetRing(ring: Ring, delta: number, options: OffsetOptions): Vec[] {
  const points = withoutDoubles(ring);
  const count = points.length;
  if (count < 2) return [];
  const tolerance = options.tolerance ?? DEFAULT_TOLERANCE;
  const ways = points.map((point, i) => unit(point, points[(i + 1) % count]!));
  const out: Vec[] = [];
  for (let i = 0; i < count; i++) {
    const before = ways[(i + count - 1) % count]!;
    joint(out, points[i]!, before, ways[i]!, delta, { corners: options.corners ?? 'round', tolerance });
  }
  return out;
}

function joint(
  out: Vec[],
  corner: Vec,
  before: Vec,
  after: Vec,
  delta: number,
  options: Required<OffsetOptions>,
): void {
  const turn = Math.atan2(cross(before, after), dot(before, after));
  const isReversal = Math.abs(Math.abs(turn) - Math.PI) < 1e-9;
  const opens = isReversal ? delta > 0 : turn * delta > 0;
  const size = Math.abs(delta);
  const half = Math.abs(turn) / 2;
  if (!opens) {
    // Nearly straight: one point; else the two ends, whose loop the filling takes away.
    if (half < 1e-6) out.push(moved(corner, after, delta));
    else out.push(moved(corner, before, delta), moved(corner, after, delta));
    return;
  }
  const reach = 1 / Math.cos(half);
  const isSmooth = size * (reach - 1) <= options.tolerance / 2;
  if (!isReversal && (isSmooth || (options.corners === 'sharp' && reach <= MITRE_LIMIT))) {
    const x = before.y + after.y;
    const y = -before.x - after.x;
    const scale = (delta * reach) / Math.hypot(x, y);
    out.push({ x: corner.x + x * scale, y: corner.y + y * scale });
    return;
  }
  const sweep = isReversal ? Math.PI : turn;
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
