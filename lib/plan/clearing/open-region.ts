import { intersectRegions } from '@/lib/geometry/boolean';
import type { Region } from '@/lib/geometry/contour';
import { growRegion, insetRegion } from '../shared/inset-region';

/** Leavings thinner than twice this are the two offsets' rounding, not wood, mm. */
const THINNEST = 0.006;

/** All places that a disc of `radius` comes over while it stays in the region, `allowance` off its walls. */
export function openRegion(region: Region, radius: number, allowance = 0): Region {
  return growRegion(insetRegion(region, radius + allowance), radius);
}

/** A region without its parts that are thinner than rounding makes them. */
export function withoutSlivers(region: Region): Region {
  const core = insetRegion(region, THINNEST);
  return core.length === 0 ? [] : intersectRegions(growRegion(core, 2 * THINNEST), region);
}
