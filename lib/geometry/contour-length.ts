import { arcRadius, arcSweep } from './arc';
import type { Contour, CubicSegment, Segment } from './contour';
import { cubicPoint } from './flatten';
import { distance, dot, lerp, normalize, rotate, subtract, type Vec } from './vec';

/** Steps of t over which a cubic's length is summed; each is measured by 5-point Gauss–Legendre quadrature. */
const CUBIC_STEPS = 16;
const GAUSS: readonly (readonly [node: number, weight: number])[] = [
  [0, 128 / 225],
  [Math.sqrt(5 - 2 * Math.sqrt(10 / 7)) / 3, (322 + 13 * Math.sqrt(70)) / 900],
  [-Math.sqrt(5 - 2 * Math.sqrt(10 / 7)) / 3, (322 + 13 * Math.sqrt(70)) / 900],
  [Math.sqrt(5 + 2 * Math.sqrt(10 / 7)) / 3, (322 - 13 * Math.sqrt(70)) / 900],
  [-Math.sqrt(5 + 2 * Math.sqrt(10 / 7)) / 3, (322 - 13 * Math.sqrt(70)) / 900],
];

/** A place on a contour and the unit vector of its drawn direction there. */
export interface ContourPlace {
  readonly point: Vec;
  readonly tangent: Vec;
}

/** Length of a contour along its true curve, mm. */
export function contourLength(contour: Contour): number {
  let length = 0;
  eachSegment(contour, (from, segment) => (length += segmentLength(from, segment)));
  return length;
}

/** The place at `fraction` 0…1 of the length, from the first point in drawn direction; clamped. */
export function pointAtFraction(contour: Contour, fraction: number): ContourPlace {
  const total = contourLength(contour);
  let left = Math.min(1, Math.max(0, fraction)) * total;
  let place: ContourPlace | null = null;
  eachSegment(contour, (from, segment) => {
    const length = segmentLength(from, segment);
    if (length === 0) return;
    if (left >= 0 && (place === null || left > 0))
      place = placeOn(from, segment, Math.min(left, length), length);
    left -= length;
  });
  return place ?? { point: contour.start, tangent: { x: 1, y: 0 } };
}

/** The fraction 0…1 of the length at which the contour is nearest to `point`. */
export function fractionOfPoint(contour: Contour, point: Vec): number {
  const total = contourLength(contour);
  if (total === 0) return 0;
  let best = 0;
  let near = Number.POSITIVE_INFINITY;
  let gone = 0;
  eachSegment(contour, (from, segment) => {
    const length = segmentLength(from, segment);
    const at = nearestOn(from, segment, length, point);
    const away = distance(placeOn(from, segment, at, length).point, point);
    if (away < near) {
      near = away;
      best = gone + at;
    }
    gone += length;
  });
  return best / total;
}

function eachSegment({ start, segments }: Contour, visit: (from: Vec, segment: Segment) => void): void {
  let from = start;
  for (const segment of segments) {
    visit(from, segment);
    from = segment.to;
  }
}

function segmentLength(from: Vec, segment: Segment): number {
  if (segment.kind === 'line') return distance(from, segment.to);
  if (segment.kind === 'arc') return arcRadius(from, segment) * Math.abs(arcSweep(from, segment));
  return cubicLength(from, segment, 0, 1);
}

function cubicLength(from: Vec, cubic: CubicSegment, t0: number, t1: number): number {
  const half = (t1 - t0) / CUBIC_STEPS / 2;
  let sum = 0;
  for (let step = 0; step < CUBIC_STEPS; step++) {
    const middle = t0 + half * (2 * step + 1);
    for (const [node, weight] of GAUSS) {
      const { x, y } = cubicVelocity(from, cubic, middle + half * node);
      sum += weight * Math.hypot(x, y);
    }
  }
  return sum * half;
}

function cubicVelocity(a: Vec, { control1: b, control2: c, to: d }: CubicSegment, t: number): Vec {
  const s = 1 - t;
  const part = (p: number, q: number, r: number, u: number): number =>
    3 * (s * s * (q - p) + 2 * s * t * (r - q) + t * t * (u - r));
  return { x: part(a.x, b.x, c.x, d.x), y: part(a.y, b.y, c.y, d.y) };
}

function placeOn(from: Vec, segment: Segment, at: number, length: number): ContourPlace {
  if (segment.kind === 'line') {
    const point = lerp(from, segment.to, length > 0 ? at / length : 0);
    return { point, tangent: normalize(subtract(segment.to, from)) ?? { x: 1, y: 0 } };
  }
  if (segment.kind === 'arc') {
    const sweep = arcSweep(from, segment);
    const spoke = rotate(subtract(from, segment.center), (sweep * at) / length);
    const way = segment.ccw ? { x: -spoke.y, y: spoke.x } : { x: spoke.y, y: -spoke.x };
    return {
      point: { x: segment.center.x + spoke.x, y: segment.center.y + spoke.y },
      tangent: normalize(way) ?? { x: 1, y: 0 },
    };
  }
  const t = cubicParameter(from, segment, at, length);
  const point = cubicPoint(from, segment.control1, segment.control2, segment.to, t);
  return { point, tangent: cubicTangent(from, segment, t) };
}

/** The parameter at a length along a cubic, by bisection of its length: monotone, so it always ends. */
function cubicParameter(from: Vec, cubic: CubicSegment, at: number, length: number): number {
  if (at <= 0) return 0;
  if (at >= length) return 1;
  let low = 0;
  let high = 1;
  for (let i = 0; i < 40; i++) {
    const middle = (low + high) / 2;
    if (cubicLength(from, cubic, 0, middle) < at) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/** The direction of a cubic; where it stands still (a handle of no length) that of its chord beyond. */
function cubicTangent(from: Vec, cubic: CubicSegment, t: number): Vec {
  const still = normalize(cubicVelocity(from, cubic, t));
  if (still) return still;
  const near = t < 0.5 ? t + 1e-4 : t - 1e-4;
  return normalize(cubicVelocity(from, cubic, near)) ?? normalize(subtract(cubic.to, from)) ?? { x: 1, y: 0 };
}

/** Length along the segment at which it is nearest to `point`. */
function nearestOn(from: Vec, segment: Segment, length: number, point: Vec): number {
  if (length === 0) return 0;
  if (segment.kind === 'line') {
    const along = subtract(segment.to, from);
    return Math.min(1, Math.max(0, dot(subtract(point, from), along) / dot(along, along))) * length;
  }
  let best = 0;
  let near = Number.POSITIVE_INFINITY;
  const steps = 64;
  const away = (at: number): number => distance(placeOn(from, segment, at, length).point, point);
  for (let i = 0; i <= steps; i++) {
    const at = (length * i) / steps;
    const d = away(at);
    if (d < near) {
      near = d;
      best = at;
    }
  }
  return refine(away, Math.max(0, best - length / steps), Math.min(length, best + length / steps));
}

/** Golden-section search of a minimum that is alone between `low` and `high`. */
function refine(f: (at: number) => number, low: number, high: number): number {
  const ratio = (Math.sqrt(5) - 1) / 2;
  let a = low;
  let b = high;
  for (let i = 0; i < 40; i++) {
    const c = b - ratio * (b - a);
    const d = a + ratio * (b - a);
    if (f(c) < f(d)) b = d;
    else a = c;
  }
  return (a + b) / 2;
}
