import type { Contour, Segment } from './contour';
import { cross, distance, dot, subtract, type Vec } from './vec';

/**
 * Longest turn of one written arc. Near half a turn a rounded radius moves the centre far (by ε·√(r/ε)); up to a third
 * of a turn it moves it by no more than twice the rounding.
 */
const LONGEST_ARC = (2 * Math.PI) / 3 + 1e-9;

/**
 * Writes contours as SVG path data in their own frame, y up: an arc's sweep flag 1 is counter-clockwise. Coordinates
 * are rounded to `decimals`, radii two places finer; arcs leave as circular `A`, long ones in pieces.
 */
export function contoursToPathData(contours: readonly Contour[], decimals = 4): string {
  const parts: string[] = [];
  for (const contour of contours) {
    const write = createWriter(parts, decimals);
    write.move(contour.start);
    let from = contour.start;
    contour.segments.forEach((segment, i) => {
      const isWayBack = contour.closed && i === contour.segments.length - 1 && segment.kind === 'line';
      if (!isWayBack) write.segment(from, segment);
      from = segment.to;
    });
    if (contour.closed) parts.push('Z');
  }
  return parts.join(' ');
}

function createWriter(parts: string[], decimals: number) {
  const number = (value: number, places = decimals) => plainNumber(value, places);
  const point = ({ x, y }: Vec) => `${number(x)} ${number(y)}`;
  return {
    move: (to: Vec) => void parts.push(`M${point(to)}`),
    segment(from: Vec, segment: Segment) {
      switch (segment.kind) {
        case 'line':
          parts.push(`L${point(segment.to)}`);
          break;
        case 'cubic':
          parts.push(`C${point(segment.control1)} ${point(segment.control2)} ${point(segment.to)}`);
          break;
        case 'arc': {
          const radius = number(distance(from, segment.center), decimals + 2);
          for (const to of arcStops(from, segment)) {
            parts.push(`A${radius} ${radius} 0 0 ${segment.ccw ? 1 : 0} ${point(to)}`);
          }
        }
      }
    },
  };
}

/** Ends of the pieces of an arc. */
function arcStops(from: Vec, { to, center, ccw }: Extract<Segment, { kind: 'arc' }>): Vec[] {
  const a = subtract(from, center);
  const b = subtract(to, center);
  const turn = Math.atan2(cross(a, b), dot(a, b)); // −π…π, counter-clockwise
  const sweep = ccw ? positiveTurn(turn) : -positiveTurn(-turn);
  const count = Math.ceil(Math.abs(sweep) / LONGEST_ARC);
  return Array.from({ length: count }, (_, i) => {
    if (i === count - 1) return to;
    const angle = (sweep * (i + 1)) / count;
    const c = Math.cos(angle);
    const s = Math.sin(angle);
    return { x: center.x + a.x * c - a.y * s, y: center.y + a.x * s + a.y * c };
  });
}

/** The same turn within 0 < turn ≤ 2π: an arc that ends where it starts is a full circle. */
function positiveTurn(turn: number): number {
  return turn > 1e-12 ? turn : turn + 2 * Math.PI;
}

/** A decimal without exponent, trailing zeros or minus zero. */
function plainNumber(value: number, decimals: number): string {
  const text = value.toFixed(decimals);
  const short = text.includes('.') ? text.replace(/\.?0+$/, '') : text;
  return short === '-0' ? '0' : short;
}
