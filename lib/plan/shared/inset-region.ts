import type { Region, Ring } from '@/lib/geometry/contour';
import { ringArea } from '@/lib/geometry/measure';
import { offsetRegion } from '@/lib/geometry/offset';
import { regionPieces } from '@/lib/geometry/pieces';
import { add, distance, dot, scale, subtract, type Vec } from '@/lib/geometry/vec';

/** Offsets lie this near to the distance they were asked for, mm. */
const OFFSET_ERROR = 0.02;

/** Points of a ring that are looked at: a ring that turned inside out is wrong at every one of its points. */
const CHECKED_POINTS = 3;

/**
 * The places of a region that are at least `by` mm inside it, piece by piece: insets of separate pieces never meet, and
 * clipping takes more than twice as long for twice as much. Each result is checked against the exact distance: the
 * offset curve of a piece that is narrower than the inset turns inside out and may seem to leave something.
 */
export function insetRegion(region: Region, by: number): Region {
  if (by === 0) return region;
  return regionPieces(region).flatMap((piece) =>
    regionPieces(offsetRegion(piece, -by))
      .filter(([outer]) => outer && isAway(outer, piece, by))
      .flat(),
  );
}

/**
 * A region grown by `by` mm, corners round or sharp. Holes narrower than that are gone; each one left is checked
 * against the exact distance for the same reason as insets are.
 */
export function growRegion(region: Region, by: number, corners: 'round' | 'sharp' = 'round'): Region {
  const grown = offsetRegion(region, by, { corners });
  if (by === 0) return grown;
  return grown.filter((ring) => ringArea(ring) > 0 || isAway(ring, region, by));
}

function isAway(ring: Ring, region: Region, by: number): boolean {
  for (let i = 0; i < CHECKED_POINTS; i++) {
    const p = ring[Math.floor((i * ring.length) / CHECKED_POINTS)];
    if (p && distanceToEdges(region, p) < by - OFFSET_ERROR) return false;
  }
  return true;
}

function distanceToEdges(region: Region, p: Vec): number {
  let least = Infinity;
  for (const ring of region) {
    for (let i = 0; i < ring.length; i++) {
      const a = ring[i]!;
      const along = subtract(ring[(i + 1) % ring.length]!, a);
      const size = dot(along, along);
      const t = size > 0 ? Math.min(1, Math.max(0, dot(subtract(p, a), along) / size)) : 0;
      least = Math.min(least, distance(p, add(a, scale(along, t))));
    }
  }
  return least;
}
