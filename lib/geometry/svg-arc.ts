import { SAME_POINT } from '@/lib/base/tolerances';
import type { Segment } from './contour';
import { distance, rotate, type Vec } from './vec';

/** The parameters of an `A` command of SVG path data. */
export interface EndpointArc {
  readonly rx: number;
  readonly ry: number;
  /** Turn of the ellipse's x axis, radians. */
  readonly rotation: number;
  readonly largeArc: boolean;
  /** Increasing angle: counter-clockwise where y runs up. */
  readonly sweep: boolean;
  readonly to: Vec;
}

/** An elliptical arc by its centre. Angles in radians. */
export interface CentreArc {
  readonly center: Vec;
  /** Radii, made larger where they could not reach from end to end. */
  readonly rx: number;
  readonly ry: number;
  readonly startAngle: number;
  /** Signed. */
  readonly sweepAngle: number;
}

/** Cubics span at most this much of an ellipse's own angle: they then lie within 1e-7 of the larger radius. */
const CUBIC_SPAN = Math.PI / 8;

/**
 * An SVG arc as segments: a line where a radius is 0, an exact arc where both are equal, cubics else; none where it
 * ends where it starts (SVG 2, section 9.5.1 and implementation notes B.2).
 */
export function svgArcSegments(from: Vec, arc: EndpointArc): Segment[] {
  if (distance(from, arc.to) <= SAME_POINT * 1e-3) return [];
  if (arc.rx === 0 || arc.ry === 0) return [{ kind: 'line', to: arc.to }];
  const centre = centreOfArc(from, arc);
  if (Math.abs(centre.rx - centre.ry) <= 1e-12 * centre.rx) {
    return [{ kind: 'arc', to: arc.to, center: centre.center, ccw: centre.sweepAngle > 0 }];
  }
  return ellipseCubics(centre, arc);
}

/** From end points to centre, by the implementation notes of SVG 2, B.2.4 and B.2.5 (F.6.5 and F.6.6 of SVG 1.1). */
export function centreOfArc(from: Vec, { rx, ry, rotation, largeArc, sweep, to }: EndpointArc): CentreArc {
  const half = rotate({ x: (from.x - to.x) / 2, y: (from.y - to.y) / 2 }, -rotation);
  let a = Math.abs(rx);
  let b = Math.abs(ry);
  const lack = (half.x / a) ** 2 + (half.y / b) ** 2;
  if (lack > 1) {
    a *= Math.sqrt(lack);
    b *= Math.sqrt(lack);
  }
  const onAxes = (a * half.y) ** 2 + (b * half.x) ** 2;
  const root = Math.sqrt(Math.max(0, (a * a * b * b - onAxes) / onAxes)) * (largeArc === sweep ? -1 : 1);
  const local = { x: (root * a * half.y) / b, y: (-root * b * half.x) / a };
  const { x, y } = rotate(local, rotation);
  const startAngle = Math.atan2((half.y - local.y) / b, (half.x - local.x) / a);
  const endAngle = Math.atan2((-half.y - local.y) / b, (-half.x - local.x) / a);
  let sweepAngle = endAngle - startAngle;
  if (sweep && sweepAngle < 0) sweepAngle += 2 * Math.PI;
  if (!sweep && sweepAngle > 0) sweepAngle -= 2 * Math.PI;
  return {
    center: { x: x + (from.x + to.x) / 2, y: y + (from.y + to.y) / 2 },
    rx: a,
    ry: b,
    startAngle,
    sweepAngle,
  };
}

function ellipseCubics({ center, rx, ry, startAngle, sweepAngle }: CentreArc, arc: EndpointArc): Segment[] {
  const count = Math.max(1, Math.ceil(Math.abs(sweepAngle) / CUBIC_SPAN));
  const step = sweepAngle / count;
  const handle = (4 / 3) * Math.tan(step / 4);
  const place = (x: number, y: number): Vec => {
    const turned = rotate({ x: rx * x, y: ry * y }, arc.rotation);
    return { x: center.x + turned.x, y: center.y + turned.y };
  };
  return Array.from({ length: count }, (_, i): Segment => {
    const t0 = startAngle + step * i;
    const t1 = t0 + step;
    return {
      kind: 'cubic',
      control1: place(Math.cos(t0) - handle * Math.sin(t0), Math.sin(t0) + handle * Math.cos(t0)),
      control2: place(Math.cos(t1) + handle * Math.sin(t1), Math.sin(t1) - handle * Math.cos(t1)),
      to: i === count - 1 ? arc.to : place(Math.cos(t1), Math.sin(t1)),
    };
  });
}
