import { clip } from './clip';
import type { Polyline, Region, Ring } from './contour';
import { offsetRing, type OffsetOptions } from './raw-offset';
import type { Vec } from './vec';

export type { OffsetOptions } from './raw-offset';

/**
 * The region grown by `delta` mm (shrunk where it is negative): all points within `delta` of it, or all that are
 * farther than that from its outside. Corners that open are rounded, or run sharp; the curves lie within the tolerance
 * (0.0025 mm) of the true ones. What shrinks to nothing is gone.
 */
export function offsetRegion(region: Region, delta: number, options: OffsetOptions = {}): Region {
  if (!Number.isFinite(delta)) throw new RangeError(`Cannot offset by ${delta}`);
  if (delta === 0) return region;
  const raw = region.flatMap((ring) => {
    const moved = offsetRing(ring, delta, options);
    return moved.length > 2 ? [moved] : [];
  });
  return clip('union', raw, [], 'positive');
}

/** The area that a disc of `radius` mm sweeps when its centre runs along a polyline. */
export function strokePolyline(
  { points, closed }: Polyline,
  radius: number,
  options: OffsetOptions = {},
): Region {
  if (!(radius > 0)) throw new RangeError(`Cannot sweep a disc of radius ${radius}`);
  const [first] = points;
  if (!first) return [];
  const line: readonly Vec[] = closed ? [...points, first] : points;
  // There and back again is a ring without area; grown, it is the stroke.
  const ring: Ring = [...line, ...line.slice(1, -1).reverse()];
  const round: OffsetOptions = { ...options, corners: 'round' };
  const raw =
    ring.length === 1 ? circleRing(first, radius, options.tolerance) : offsetRing(ring, radius, round);
  return raw.length > 2
    ? clip('union', [raw], [], 'positive')
    : clip('union', [circleRing(first, radius, options.tolerance)], [], 'positive');
}

/** A circle as a ring, counter-clockwise, its points on the circle. */
export function circleRing(center: Vec, radius: number, tolerance = 0.0025): Ring {
  const step = radius > tolerance ? 2 * Math.acos(1 - tolerance / radius) : Math.PI / 2;
  const count = Math.max(8, Math.ceil((2 * Math.PI) / step));
  return Array.from({ length: count }, (_, i) => {
    const angle = (2 * Math.PI * i) / count;
    return { x: center.x + radius * Math.cos(angle), y: center.y + radius * Math.sin(angle) };
  });
}
