import { DEGREES } from '@/lib/geometry/vec';
import type { Cutter } from '@/lib/job/machine-schema';

/**
 * The lower side of a turning cutter as a convex profile: how high its edge stands above its lowest point at a
 * distance from its axis. Every kind is a flat disc of `tip` radius, then either a cone or a sphere out to `radius`.
 */
export interface CutterShape {
  readonly kind: 'flat' | 'ball' | 'cone';
  /** mm. */
  readonly radius: number;
  /** Radius of the flat at the point of a cone, mm. */
  readonly tip: number;
  /** Rise of a cone per mm away from the axis. */
  readonly steepness: number;
}

export function cutterShape(cutter: Cutter): CutterShape {
  const radius = cutter.diameter / 2;
  switch (cutter.kind) {
    case 'flat':
      return { kind: 'flat', radius, tip: radius, steepness: 0 };
    case 'ball':
      return { kind: 'ball', radius, tip: 0, steepness: 0 };
    case 'vbit':
      return cone(radius, Math.min(cutter.tip / 2, radius), cutter.angle);
    case 'drill':
      return cone(radius, 0, cutter.angle);
  }
}

/** Height of the edge above the lowest point, `away` mm from the axis; Infinity beyond the radius. */
export function edgeRise({ kind, radius, tip, steepness }: CutterShape, away: number): number {
  if (away > radius) return Infinity;
  if (kind === 'flat') return 0;
  if (kind === 'ball') return radius - Math.sqrt(Math.max(0, radius * radius - away * away));
  return Math.max(0, away - tip) * steepness;
}

/** Radius of what a cutter takes at the face when its point is `depth` below it, mm. */
export function radiusAtDepth({ kind, radius, tip, steepness }: CutterShape, depth: number): number {
  if (depth <= 0) return 0;
  if (kind === 'flat') return radius;
  if (kind === 'ball') {
    const d = Math.min(depth, radius);
    return Math.sqrt(d * (2 * radius - d));
  }
  return steepness > 0 ? Math.min(radius, tip + depth / steepness) : radius;
}

/** A drill of 180° has a flat end: its cone does not rise. */
function cone(radius: number, tip: number, angle: number): CutterShape {
  const tangent = Math.tan((angle / 2) * DEGREES);
  const steepness = angle >= 180 ? 0 : 1 / tangent;
  return steepness === 0
    ? { kind: 'flat', radius, tip: radius, steepness: 0 }
    : { kind: 'cone', radius, tip, steepness };
}
