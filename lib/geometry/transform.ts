import type { ArcSegment, Contour, CubicSegment, Segment } from './contour';
import { arcToCubics } from './arc';
import type { Vec } from './vec';

/** An affine map in the order of SVG's `matrix(a b c d e f)`: x′ = a·x + c·y + e, y′ = b·x + d·y + f. */
export type Matrix = readonly [a: number, b: number, c: number, d: number, e: number, f: number];

export const IDENTITY: Matrix = [1, 0, 0, 1, 0, 0];

/** The map that does `inner` first and `outer` after it, as nested SVG transforms do. */
export function multiply(outer: Matrix, inner: Matrix): Matrix {
  const [a, b, c, d, e, f] = outer;
  const [p, q, r, s, t, u] = inner;
  return [a * p + c * q, b * p + d * q, a * r + c * s, b * r + d * s, a * t + c * u + e, b * t + d * u + f];
}

export function transformPoint({ x, y }: Vec, [a, b, c, d, e, f]: Matrix): Vec {
  return { x: a * x + c * y + e, y: b * x + d * y + f };
}

/**
 * The contour carried through `matrix`. Arcs stay arcs where the map keeps angles (their sense turns over in a mirror);
 * else they become cubics.
 */
export function transformContour({ start, segments, closed }: Contour, matrix: Matrix): Contour {
  const keepsCircles = isSimilarity(matrix);
  const mirrored = matrix[0] * matrix[3] - matrix[1] * matrix[2] < 0;
  const out: Segment[] = [];
  let from = start;
  for (const segment of segments) {
    if (segment.kind === 'arc' && keepsCircles) out.push(movedArc(segment, matrix, mirrored));
    else if (segment.kind === 'arc')
      for (const cubic of arcToCubics(from, segment)) out.push(movedCubic(cubic, matrix));
    else if (segment.kind === 'cubic') out.push(movedCubic(segment, matrix));
    else out.push({ kind: 'line', to: transformPoint(segment.to, matrix) });
    from = segment.to;
  }
  return { start: transformPoint(start, matrix), segments: out, closed };
}

function movedArc({ to, center, ccw }: ArcSegment, matrix: Matrix, mirrored: boolean): ArcSegment {
  return {
    kind: 'arc',
    to: transformPoint(to, matrix),
    center: transformPoint(center, matrix),
    ccw: mirrored ? !ccw : ccw,
  };
}

function movedCubic({ control1, control2, to }: CubicSegment, matrix: Matrix): CubicSegment {
  return {
    kind: 'cubic',
    control1: transformPoint(control1, matrix),
    control2: transformPoint(control2, matrix),
    to: transformPoint(to, matrix),
  };
}

/** Whether the columns are square to one another and equally long, so that circles stay circles. */
function isSimilarity([a, b, c, d]: Matrix): boolean {
  const first = Math.hypot(a, b);
  const second = Math.hypot(c, d);
  const size = Math.max(first, second);
  return size > 0 && Math.abs(first - second) <= 1e-9 * size && Math.abs(a * c + b * d) <= 1e-9 * size * size;
}
