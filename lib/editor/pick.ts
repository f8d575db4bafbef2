import type { Box, Polyline } from '@/lib/geometry/contour';
import { distance, dot, lerp, subtract, type Vec } from '@/lib/geometry/vec';
import type { Scene, SceneOutline } from './scene';

/** The outline whose line (or point) runs nearest to `at` within `reach` mm, or null. */
export function pickLine(scene: Scene, at: Vec, reach: number): string | null {
  let best: string | null = null;
  let near = reach;
  for (const outline of scene.outlines) {
    if (!boxHolds(outline.box, at, reach)) continue;
    const away = outlineDistance(outline, at);
    // Of two that lie on one another, the one of the face that is up is meant.
    const bias = outline.drawnOn === scene.face ? 0 : reach / 4;
    if (away + bias < near) {
      near = away + bias;
      best = outline.id;
    }
  }
  return best;
}

/** Of the outlines drawn on the face that is up and filled at `at`, the smallest, or null. */
export function pickFilled({ outlines, face }: Scene, at: Vec): string | null {
  let best: SceneOutline | null = null;
  for (const outline of outlines) {
    if (outline.drawnOn !== face || !boxHolds(outline.box, at, 0) || !fills(outline, at)) continue;
    if (!best || boxArea(outline.box) < boxArea(best.box)) best = outline;
  }
  return best?.id ?? null;
}

/** Outlines whose box lies wholly within the box from `a` to `b`. */
export function outlinesWithin({ outlines }: Scene, a: Vec, b: Vec): string[] {
  const minX = Math.min(a.x, b.x);
  const minY = Math.min(a.y, b.y);
  const maxX = Math.max(a.x, b.x);
  const maxY = Math.max(a.y, b.y);
  return outlines
    .filter(({ box }) => box.minX >= minX && box.minY >= minY && box.maxX <= maxX && box.maxY <= maxY)
    .map(({ id }) => id);
}

function outlineDistance({ lines, points }: SceneOutline, at: Vec): number {
  let near = Number.POSITIVE_INFINITY;
  for (const line of lines) near = Math.min(near, lineDistance(line, at));
  for (const point of points) near = Math.min(near, distance(point, at));
  return near;
}

function lineDistance({ points, closed }: Polyline, at: Vec): number {
  let near = Number.POSITIVE_INFINITY;
  const count = closed ? points.length : points.length - 1;
  for (let i = 0; i < count; i++) {
    const from = points[i];
    const to = points[(i + 1) % points.length];
    if (from && to) near = Math.min(near, segmentDistance(from, to, at));
  }
  return near;
}

/** Distance of `at` from the straight piece from `a` to `b`. */
export function segmentDistance(a: Vec, b: Vec, at: Vec): number {
  const along = subtract(b, a);
  const size = dot(along, along);
  const t = size > 0 ? Math.min(1, Math.max(0, dot(subtract(at, a), along) / size)) : 0;
  return distance(lerp(a, b, t), at);
}

/** Whether the closed lines of an outline fill `at`, by its own fill rule (crossings of a ray to +x). */
function fills({ lines, fillRule }: SceneOutline, at: Vec): boolean {
  let winding = 0;
  let crossings = 0;
  for (const { points, closed } of lines) {
    if (!closed) continue;
    for (let i = 0; i < points.length; i++) {
      const a = points[i];
      const b = points[(i + 1) % points.length];
      if (!a || !b || a.y > at.y === b.y > at.y) continue;
      const x = a.x + ((at.y - a.y) / (b.y - a.y)) * (b.x - a.x);
      if (x <= at.x) continue;
      crossings++;
      winding += b.y > a.y ? 1 : -1;
    }
  }
  return fillRule === 'evenodd' ? crossings % 2 === 1 : winding !== 0;
}

function boxHolds({ minX, minY, maxX, maxY }: Box, { x, y }: Vec, reach: number): boolean {
  return x >= minX - reach && x <= maxX + reach && y >= minY - reach && y <= maxY + reach;
}

function boxArea({ minX, minY, maxX, maxY }: Box): number {
  return (maxX - minX) * (maxY - minY);
}
