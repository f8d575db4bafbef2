import type { Vec } from './vec';

/** A straight run to `to`. */
export interface LineSegment {
  readonly kind: 'line';
  readonly to: Vec;
}

/** A circular arc to `to` about `center`. `ccw`: counter-clockwise seen with y up. `to` = start is a full circle. */
export interface ArcSegment {
  readonly kind: 'arc';
  readonly to: Vec;
  readonly center: Vec;
  readonly ccw: boolean;
}

/** A cubic Bézier to `to`; quadratics and turned ellipses become cubics or arcs where they are read. */
export interface CubicSegment {
  readonly kind: 'cubic';
  readonly control1: Vec;
  readonly control2: Vec;
  readonly to: Vec;
}

export type Segment = LineSegment | ArcSegment | CubicSegment;

/**
 * One exact contour in drawn order and direction. A closed contour ends where it starts: its last segment leads back
 * to `start` (a closing line is added where the drawing left a gap). `fraction` 0…1 of a tab runs from `start` by length.
 */
export interface Contour {
  readonly start: Vec;
  readonly segments: readonly Segment[];
  readonly closed: boolean;
}

/** A flattened contour. A closed one does not repeat its first point at the end. */
export interface Polyline {
  readonly points: readonly Vec[];
  readonly closed: boolean;
}

/** A closed ring of points, first point not repeated. Counter-clockwise = outer, clockwise = hole. */
export type Ring = readonly Vec[];

/**
 * A filled area: outer rings counter-clockwise, holes clockwise, none crossing itself or another. What
 * `lib/geometry/boolean` and `offset` return; filled non-zero.
 */
export type Region = readonly Ring[];

export interface Box {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}
