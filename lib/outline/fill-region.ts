import { resolveFill, unionRegions } from '@/lib/geometry/boolean';
import type { Region } from '@/lib/geometry/contour';
import { flattenContour } from '@/lib/geometry/flatten';
import type { ShapeContours } from './shape-contours';

/** Chord error of regions, mm: a quarter of the flattening tolerance, so that offsets and cleaning keep the rest. */
export const REGION_TOLERANCE = 0.0025;

/** The area that a shape's closed contours fill, by its own fill rule; groups that overlap are united. */
export function fillRegion({ contours, groups, fillRule }: ShapeContours): Region {
  let next = 0;
  const regions = groups.flatMap((count) => {
    const rings = contours
      .slice(next, (next += count))
      .filter(({ closed }) => closed)
      .map((contour) => flattenContour(contour, REGION_TOLERANCE).points);
    return rings.length > 0 ? [resolveFill(rings, fillRule)] : [];
  });
  return regions.length === 1 ? regions[0]! : unionRegions(regions);
}
