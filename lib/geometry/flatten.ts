import { FLATTEN_TOLERANCE, SAME_POINT } from '@/lib/base/tolerances';
import { arcRadius, arcSweep } from './arc';
import type { ArcSegment, Contour, CubicSegment, Polyline } from './contour';
import { distance, rotate, subtract, type Vec } from './vec';

/**
 * The contour as points that lie on it, no chord farther from it than `tolerance` mm. A closed one does not repeat its
 * first point; points that fall together are one.
 */
export function flattenContour(
  { start, segments, closed }: Contour,
  tolerance = FLATTEN_TOLERANCE,
): Polyline {
  const points: Vec[] = [start];
  const push = (point: Vec): void => {
    const last = points.at(-1);
    if (!last || distance(last, point) > SAME_POINT) points.push(point);
  };
  let from = start;
  for (const segment of segments) {
    if (segment.kind === 'line') push(segment.to);
    else if (segment.kind === 'arc') flattenArc(from, segment, tolerance, push);
    else flattenCubic(from, segment, tolerance, push);
    from = segment.to;
  }
  const last = points.at(-1);
  if (closed && points.length > 1 && last && distance(last, start) <= SAME_POINT) points.pop();
  return { points, closed };
}

/** Sagitta r·(1 − cos(θ/2)) bounds the step. */
function flattenArc(from: Vec, arc: ArcSegment, tolerance: number, push: (point: Vec) => void): void {
  const radius = arcRadius(from, arc);
  const sweep = arcSweep(from, arc);
  const largest = radius > tolerance ? 2 * Math.acos(1 - tolerance / radius) : Math.PI / 2;
  const count = Math.max(1, Math.ceil(Math.abs(sweep) / Math.min(largest, Math.PI / 2)));
  const first = subtract(from, arc.center);
  for (let i = 1; i < count; i++) {
    const { x, y } = rotate(first, (sweep * i) / count);
    push({ x: arc.center.x + x, y: arc.center.y + y });
  }
  push(arc.to);
}

/** Even steps of t: a chord's error is at most h²/8 · max|B″|, and |B″| is largest at an end. */
function flattenCubic(
  from: Vec,
  { control1, control2, to }: CubicSegment,
  tolerance: number,
  push: (point: Vec) => void,
): void {
  const bend = Math.max(secondDifference(from, control1, control2), secondDifference(control1, control2, to));
  const count = Math.max(1, Math.ceil(Math.sqrt((6 * bend) / (8 * tolerance))));
  for (let i = 1; i < count; i++) push(cubicPoint(from, control1, control2, to, i / count));
  push(to);
}

function secondDifference(a: Vec, b: Vec, c: Vec): number {
  return Math.hypot(a.x - 2 * b.x + c.x, a.y - 2 * b.y + c.y);
}

/** The point of a cubic Bézier at t in 0…1. */
export function cubicPoint(a: Vec, b: Vec, c: Vec, d: Vec, t: number): Vec {
  const s = 1 - t;
  const wa = s * s * s;
  const wb = 3 * s * s * t;
  const wc = 3 * s * t * t;
  const wd = t * t * t;
  return { x: wa * a.x + wb * b.x + wc * c.x + wd * d.x, y: wa * a.y + wb * b.y + wc * c.y + wd * d.y };
}
