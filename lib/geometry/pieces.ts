import type { Region, Ring } from './contour';
import { pointsBox, ringArea, ringContains } from './measure';
import type { Vec } from './vec';

/** The separate pieces of a region: each one outer ring first, with the holes that lie directly in it. */
export function regionPieces(region: Region): Region[] {
  const outers = region.filter((ring) => ringArea(ring) > 0);
  const pieces = outers.map((outer): { outer: Ring; area: number; rings: Ring[] } => ({
    outer,
    area: ringArea(outer),
    rings: [outer],
  }));
  // Smallest first, so that a hole goes to the innermost outer ring round it.
  const bySize = [...pieces].sort((a, b) => a.area - b.area);
  for (const ring of region) {
    if (ringArea(ring) >= 0) continue;
    const home = bySize.find(({ outer, area }) => area > -ringArea(ring) && holds(outer, ring));
    home?.rings.push(ring);
  }
  return pieces.map(({ rings }) => rings);
}

/** Whether a ring lies in another, judged by its points: clipped rings may touch, so one point is not enough. */
function holds(outer: Ring, inner: Ring): boolean {
  const box = pointsBox(outer);
  const isOutside = ({ x, y }: Vec): boolean => x < box.minX || x > box.maxX || y < box.minY || y > box.maxY;
  if (inner.some(isOutside)) return false;
  const within = inner.filter((point) => ringContains(outer, point)).length;
  return (
    within * 2 > inner.length ||
    inner.some((point, i) => ringContains(outer, between(point, inner[(i + 1) % inner.length]!)))
  );
}

function between(a: Vec, b: Vec): Vec {
  return { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 };
}
