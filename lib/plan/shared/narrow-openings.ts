import type { Region } from '@/lib/geometry/contour';
import { ringArea } from '@/lib/geometry/measure';
import { regionPieces } from '@/lib/geometry/pieces';
import { insetRegion } from './inset-region';

/**
 * Openings of an outline into which a disc of `radius` does not go at all: pieces of it where the cutter runs `inside`,
 * its holes where the cutter runs `outside`.
 */
export function narrowOpenings(region: Region, side: 'outside' | 'inside', radius: number): Region[] {
  const openings =
    side === 'inside'
      ? regionPieces(region)
      : region.filter((ring) => ringArea(ring) < 0).map((hole) => [[...hole].reverse()]);
  return openings.filter((opening) => insetRegion(opening, radius).length === 0);
}
