import type { Contour, Segment } from '@/lib/geometry/contour';
import { add, DEGREES, rotate, scale, vec, type Vec } from '@/lib/geometry/vec';
import type { Shape } from '@/lib/job/shape-schema';

type ShapeOf<Type extends Shape['type']> = Extract<Shape, { type: Type }>;

/** How far the cubics of an ellipse may lie from it, mm. */
const ELLIPSE_TOLERANCE = 1e-4;

/** Error of the usual cubic of a quarter circle of radius 1: it lies at most this far outside (4/3 · (√2 − 1) as handle). */
const QUARTER_ERROR = 2.73e-4;

/**
 * A rectangle, counter-clockwise, from its lower left after the corner's arc along the bottom edge; corner arcs exact.
 * A radius beyond half of the shorter side is taken as that half.
 */
export function rectContour({ x, y, width, height, radius, rotate: turn }: ShapeOf<'rect'>): Contour {
  const center = vec(x + width / 2, y + height / 2);
  const w = width / 2;
  const h = height / 2;
  const r = Math.min(radius, w, h);
  const place = turnedAbout(center, turn);
  const start = place(vec(r - w, -h));
  const segments: Segment[] = [];
  let at = start;
  const lineTo = (to: Vec) => {
    if (to.x !== at.x || to.y !== at.y) segments.push({ kind: 'line', to });
    at = to;
  };
  const cornerTo = (to: Vec, about: Vec) => {
    if (r > 0) segments.push({ kind: 'arc', to, center: about, ccw: true });
    at = to;
  };
  const corner = (sx: number, sy: number) => place(vec(sx * (w - r), sy * (h - r)));
  lineTo(place(vec(w - r, -h)));
  cornerTo(place(vec(w, r - h)), corner(1, -1));
  lineTo(place(vec(w, h - r)));
  cornerTo(place(vec(w - r, h)), corner(1, 1));
  lineTo(place(vec(r - w, h)));
  cornerTo(place(vec(-w, h - r)), corner(-1, 1));
  lineTo(place(vec(-w, r - h)));
  cornerTo(start, corner(-1, -1));
  return { start, segments, closed: true };
}

/** An ellipse, counter-clockwise from its own +rx: two exact half circles, or cubics within 0.0001 mm. */
export function ellipseContour({ cx, cy, rx, ry, rotate: turn }: ShapeOf<'ellipse'>): Contour {
  const center = vec(cx, cy);
  const place = turnedAbout(center, turn);
  const start = place(vec(rx, 0));
  if (rx === ry) {
    const half = (to: Vec): Segment => ({ kind: 'arc', to, center, ccw: true });
    return { start, segments: [half(place(vec(-rx, 0))), half(start)], closed: true };
  }
  const count = cubicsFor(Math.max(rx, ry));
  const step = (2 * Math.PI) / count;
  const handle = (4 / 3) * Math.tan(step / 4);
  const onEllipse = (angle: number) => vec(rx * Math.cos(angle), ry * Math.sin(angle));
  const tangent = (angle: number) => vec(-rx * Math.sin(angle), ry * Math.cos(angle));
  const segments = Array.from({ length: count }, (_, i): Segment => {
    const [from, to] = [i * step, (i + 1) * step];
    return {
      kind: 'cubic',
      control1: place(add(onEllipse(from), scale(tangent(from), handle))),
      control2: place(add(onEllipse(to), scale(tangent(to), -handle))),
      to: i === count - 1 ? start : place(onEllipse(to)),
    };
  });
  return { start, segments, closed: true };
}

/** A regular polygon, counter-clockwise from its first corner, which `rotate` 0 puts at +x. */
export function polygonContour({ cx, cy, radius, sides, rotate: turn }: ShapeOf<'polygon'>): Contour {
  const corner = (i: number): Vec => {
    const angle = turn * DEGREES + (i * 2 * Math.PI) / sides;
    return vec(cx + radius * Math.cos(angle), cy + radius * Math.sin(angle));
  };
  const start = corner(0);
  const segments = Array.from({ length: sides }, (_, i): Segment => ({
    kind: 'line',
    to: i === sides - 1 ? start : corner(i + 1),
  }));
  return { start, segments, closed: true };
}

/** Maps a point given from `center` to the board, turned by `degrees`. */
function turnedAbout(center: Vec, degrees: number): (offset: Vec) => Vec {
  return degrees === 0
    ? (offset) => add(center, offset)
    : (offset) => add(center, rotate(offset, degrees * DEGREES));
}

/** Cubics around a circle of that radius so that they stay within the tolerance: the error falls with the sixth power of the angle. */
function cubicsFor(radius: number): number {
  return 4 * Math.max(1, Math.ceil(((QUARTER_ERROR * radius) / ELLIPSE_TOLERANCE) ** (1 / 6)));
}
