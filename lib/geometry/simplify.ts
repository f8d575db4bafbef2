import type { Region, Ring } from './contour';
import { ringArea } from './measure';
import type { Vec } from './vec';

/** The polyline with fewer points, none of those left out farther than `tolerance` from it (Douglas–Peucker). Ends stay. */
export function simplifyPolyline(points: readonly Vec[], tolerance: number): Vec[] {
  if (points.length < 3) return [...points];
  const keep = new Uint8Array(points.length);
  keep[0] = 1;
  keep[points.length - 1] = 1;
  keepBetween(points, keep, 0, points.length - 1, tolerance * tolerance);
  return points.filter((_, i) => keep[i] === 1);
}

/** The same for a ring, split at its two points that are farthest apart, so that its start is no corner by chance. */
export function simplifyRing(ring: Ring, tolerance: number): Ring {
  if (ring.length < 4) return ring;
  const start = farthestFrom(ring, ring[0]!);
  const turned = [...ring.slice(start), ...ring.slice(0, start)];
  const end = farthestFrom(turned, turned[0]!);
  const there = simplifyPolyline(turned.slice(0, end + 1), tolerance);
  const back = simplifyPolyline([...turned.slice(end), turned[0]!], tolerance);
  const out = [...there.slice(0, -1), ...back.slice(0, -1)];
  return out.length > 2 ? out : ring;
}

/** Every ring of a region simplified; slivers whose area is lost are dropped. */
export function simplifyRegion(region: Region, tolerance: number): Region {
  return region
    .map((ring) => simplifyRing(ring, tolerance))
    .filter((ring) => ring.length > 2 && ringArea(ring) !== 0);
}

/** Without recursion: a coast of 100,000 points would be too deep. */
function keepBetween(
  points: readonly Vec[],
  keep: Uint8Array,
  first: number,
  last: number,
  limit: number,
): void {
  const stack = [first, last];
  while (stack.length > 0) {
    const b = stack.pop()!;
    const a = stack.pop()!;
    let far = limit;
    let index = -1;
    for (let i = a + 1; i < b; i++) {
      const away = squaredDistance(points[i]!, points[a]!, points[b]!);
      if (away > far) {
        far = away;
        index = i;
      }
    }
    if (index < 0) continue;
    keep[index] = 1;
    stack.push(a, index, index, b);
  }
}

function squaredDistance(p: Vec, a: Vec, b: Vec): number {
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  const size = dx * dx + dy * dy;
  const t = size > 0 ? Math.min(1, Math.max(0, ((p.x - a.x) * dx + (p.y - a.y) * dy) / size)) : 0;
  const x = p.x - a.x - t * dx;
  const y = p.y - a.y - t * dy;
  return x * x + y * y;
}

function farthestFrom(points: readonly Vec[], from: Vec): number {
  let best = 0;
  let far = -1;
  points.forEach(({ x, y }, i) => {
    const away = (x - from.x) ** 2 + (y - from.y) ** 2;
    if (away > far) {
      far = away;
      best = i;
    }
  });
  return best;
}
