import { differenceRegions, intersectRegions } from '@/lib/geometry/boolean';
import type { Region } from '@/lib/geometry/contour';
import type { CutOf } from '@/lib/job/cut-schema';
import { cutterOf } from '@/lib/job/cut-values';
import type { Job } from '@/lib/job/job-schema';
import type { ResolvedOutlines } from '@/lib/outline/resolve-outlines';
import { openRegion, withoutSlivers } from '../../clearing/open-region';
import { pocketArea } from './pocket-area';

/**
 * What an earlier pocket had to leave of `area` and a disc of `radius` can reach: the area less the earlier cutter's
 * opening of its own area (all places its disc comes over). A disabled cut took nothing away.
 */
export function leavingsOf(
  job: Job,
  earlier: CutOf<'pocket'>,
  area: Region,
  radius: number,
  resolved: ResolvedOutlines,
): Region {
  const reachable = openRegion(area, radius);
  if (!earlier.enabled) return reachable;
  const reached = openRegion(
    pocketArea(job, earlier, resolved),
    cutterOf(job, earlier).diameter / 2,
    earlier.allowance,
  );
  return withoutSlivers(intersectRegions(differenceRegions(area, reached), reachable));
}
