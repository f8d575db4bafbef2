import { clip } from './clip';
import type { Region, Ring } from './contour';

/** The area that rings fill by a fill rule, as a region without crossings. */
export function resolveFill(rings: readonly Ring[], rule: 'nonzero' | 'evenodd'): Region {
  return clip('union', rings, [], rule);
}

/** What lies in any of the regions. */
export function unionRegions(regions: readonly Region[]): Region {
  return clip('union', regions.flat(), [], 'nonzero');
}

/** What lies in `a` and not in `b`. */
export function differenceRegions(a: Region, b: Region): Region {
  return clip('difference', a, b, 'nonzero');
}

/** What lies in both. */
export function intersectRegions(a: Region, b: Region): Region {
  return clip('intersection', a, b, 'nonzero');
}

/** What lies in an odd number of the regions: one drawn inside another is an island. */
export function evenOddRegions(regions: readonly Region[]): Region {
  return regions.reduce<Region>((sum, region) => clip('xor', sum, region, 'nonzero'), []);
}
