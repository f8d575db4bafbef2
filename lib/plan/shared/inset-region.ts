import type { Region } from '@/lib/geometry/contour';
import { createDistanceQuery } from '@/lib/geometry/distance-query';
import { ringArea } from '@/lib/geometry/measure';
import { offsetRegion } from '@/lib/geometry/offset';
import { regionPieces } from '@/lib/geometry/pieces';

/** Insets lie this near to the distance they were asked for, mm. */
const INSET_ERROR = 0.02;

/**
 * The places of a region that are at least `by` mm inside it. Each piece is checked against the exact distance: an
 * inset curve of a region that is narrower than the inset turns inside out and may seem to leave something.
 */
export function insetRegion(region: Region, by: number): Region {
  const inset = offsetRegion(region, -by);
  if (inset.length === 0 || by === 0) return inset;
  const edge = createDistanceQuery(region);
  return regionPieces(inset)
    .filter(([outer]) => outer?.every((p) => edge.distance(p) >= by - INSET_ERROR))
    .flat();
}

/**
 * A region grown by `by` mm, corners round or sharp. Holes narrower than that are gone; each one left is checked
 * against the exact distance for the same reason as insets are.
 */
export function growRegion(region: Region, by: number, corners: 'round' | 'sharp' = 'round'): Region {
  const grown = offsetRegion(region, by, { corners });
  if (grown.length === 0 || by === 0) return grown;
  const edge = createDistanceQuery(region);
  return grown.filter(
    (ring) => ringArea(ring) > 0 || ring.every((p) => edge.distance(p) >= by - INSET_ERROR),
  );
}
