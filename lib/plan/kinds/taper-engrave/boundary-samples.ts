import type { Region } from '@/lib/geometry/contour';
import { cross, distance, dot, lerp, subtract, type Vec } from '@/lib/geometry/vec';

/** A boundary as points close together, with what pruning needs to know of each. */
export interface BoundarySamples {
  /** x, y of each. */
  readonly at: Float64Array;
  readonly ring: Int32Array;
  /** Length along its ring from the ring's first point. */
  readonly along: Float64Array;
  readonly ringLengths: readonly number[];
  /** Vertices at which the area has a sharp corner that points outward. */
  readonly corners: readonly Vec[];
}

/** A vertex that turns the boundary left by more than this is a corner and not a step of a flattened curve (radians). */
const LEAST_CORNER = 0.26;

/** Samples the rings of a region (outer counter-clockwise, holes clockwise) at most `step` mm apart, vertices included. */
export function sampleBoundary(region: Region, step: number): BoundarySamples {
  const at: number[] = [];
  const ringOf: number[] = [];
  const along: number[] = [];
  const ringLengths: number[] = [];
  const corners: Vec[] = [];
  region.forEach((ring, which) => {
    let gone = 0;
    ring.forEach((a, i) => {
      const b = ring[(i + 1) % ring.length]!;
      const before = ring[(i + ring.length - 1) % ring.length]!;
      if (leftTurn(before, a, b) > LEAST_CORNER) corners.push(a);
      const size = distance(a, b);
      const count = Math.max(1, Math.ceil(size / step));
      for (let k = 0; k < count; k++) {
        const p = lerp(a, b, k / count);
        at.push(p.x, p.y);
        ringOf.push(which);
        along.push(gone + (size * k) / count);
      }
      gone += size;
    });
    ringLengths.push(gone);
  });
  return {
    at: Float64Array.from(at),
    ring: Int32Array.from(ringOf),
    along: Float64Array.from(along),
    ringLengths,
    corners,
  };
}

function leftTurn(before: Vec, at: Vec, after: Vec): number {
  const a = subtract(at, before);
  const b = subtract(after, at);
  return Math.atan2(cross(a, b), dot(a, b));
}
