import type { ArcSegment, CubicSegment } from './contour';
import { cross, distance, dot, rotate, subtract, type Vec } from './vec';

/** How far an arc's cubics may lie from it, as a share of its radius: a quarter circle's is 2.73e-4, a sixteenth's 7e-8. */
const CUBIC_SPAN = Math.PI / 8;

/**
 * Signed turn of an arc from `from`, radians: positive counter-clockwise, between 0 and ±2π. An arc that ends where it
 * starts is a full circle.
 */
export function arcSweep(from: Vec, { to, center, ccw }: Pick<ArcSegment, 'to' | 'center' | 'ccw'>): number {
  const a = subtract(from, center);
  const b = subtract(to, center);
  const turn = Math.atan2(cross(a, b), dot(a, b));
  const full = 2 * Math.PI;
  if (ccw) return turn > 1e-12 ? turn : turn + full;
  return turn < -1e-12 ? turn : turn - full;
}

/** Radius of an arc from `from`, mm. */
export function arcRadius(from: Vec, { center }: Pick<ArcSegment, 'center'>): number {
  return distance(from, center);
}

/** Cubics that follow an arc to within 1e-7 of its radius (handles 4/3·tan(θ/4), the usual fit). */
export function arcToCubics(from: Vec, arc: ArcSegment): CubicSegment[] {
  const sweep = arcSweep(from, arc);
  const count = Math.max(1, Math.ceil(Math.abs(sweep) / CUBIC_SPAN));
  const step = sweep / count;
  const handle = (4 / 3) * Math.tan(step / 4);
  const first = subtract(from, arc.center);
  return Array.from({ length: count }, (_, i) => {
    const a = rotate(first, step * i);
    const b = rotate(first, step * (i + 1));
    const place = ({ x, y }: Vec): Vec => ({ x: arc.center.x + x, y: arc.center.y + y });
    return {
      kind: 'cubic',
      control1: place({ x: a.x - handle * a.y, y: a.y + handle * a.x }),
      control2: place({ x: b.x + handle * b.y, y: b.y - handle * b.x }),
      to: i === count - 1 ? arc.to : place(b),
    };
  });
}
