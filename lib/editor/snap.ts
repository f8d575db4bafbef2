import type { Contour } from '@/lib/geometry/contour';
import { distance, lerp, vec, type Vec } from '@/lib/geometry/vec';

/** A place worth hitting exactly, and what it is. */
export interface SnapPoint {
  readonly at: Vec;
  readonly name: 'end' | 'middle' | 'centre' | 'corner of the board' | 'edge of the board' | 'grid';
}

export interface Snapped {
  readonly at: Vec;
  /** What it snapped to, or null where nothing was near. */
  readonly name: SnapPoint['name'] | null;
}

/** Ends and middles of the segments of contours, and the centres of their arcs and boxes. */
export function contourSnapPoints(contours: readonly Contour[]): SnapPoint[] {
  return contours.flatMap(({ start, segments, closed }) => {
    const points: SnapPoint[] = closed ? [] : [{ at: start, name: 'end' }];
    let from = start;
    for (const segment of segments) {
      points.push({ at: segment.to, name: 'end' });
      if (segment.kind === 'line') points.push({ at: lerp(from, segment.to, 0.5), name: 'middle' });
      if (segment.kind === 'arc') points.push({ at: segment.center, name: 'centre' });
      from = segment.to;
    }
    return points;
  });
}

/** Corners, middles of the edges and the centre of the board. */
export function boardSnapPoints({ x, y }: { x: number; y: number }): SnapPoint[] {
  const corners = [vec(0, 0), vec(x, 0), vec(x, y), vec(0, y)];
  return [
    ...corners.map((at): SnapPoint => ({ at, name: 'corner of the board' })),
    ...corners.map((at, i): SnapPoint => ({ at: lerp(at, corners[(i + 1) % 4] ?? at, 0.5), name: 'middle' })),
    { at: vec(x / 2, y / 2), name: 'centre' },
  ];
}

/**
 * The nearest of `points` within `reach` mm; else the board's edge on either axis; else the grid of pitch `grid` mm
 * (0 for none), which is only taken where it is within reach too.
 */
export function snapTo(
  at: Vec,
  points: readonly SnapPoint[],
  board: { x: number; y: number },
  { reach, grid }: { reach: number; grid: number },
): Snapped {
  let best: SnapPoint | null = null;
  let near = reach;
  for (const point of points) {
    const away = distance(at, point.at);
    if (away < near) {
      near = away;
      best = point;
    }
  }
  if (best) return best;
  const onEdge = vec(toEdge(at.x, board.x, reach), toEdge(at.y, board.y, reach));
  const isEdge = onEdge.x !== at.x || onEdge.y !== at.y;
  if (grid <= 0) return { at: onEdge, name: isEdge ? 'edge of the board' : null };
  const onGrid = vec(
    onEdge.x === at.x ? gridStop(at.x, grid, reach) : onEdge.x,
    onEdge.y === at.y ? gridStop(at.y, grid, reach) : onEdge.y,
  );
  const moved = onGrid.x !== at.x || onGrid.y !== at.y;
  return { at: onGrid, name: isEdge ? 'edge of the board' : moved ? 'grid' : null };
}

function toEdge(value: number, size: number, reach: number): number {
  if (Math.abs(value) < reach) return 0;
  return Math.abs(value - size) < reach ? size : value;
}

function gridStop(value: number, grid: number, reach: number): number {
  const stop = Math.round(value / grid) * grid;
  return Math.abs(stop - value) < reach ? Number(stop.toFixed(6)) : value;
}
