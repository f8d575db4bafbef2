import { evenOddRegions } from '@/lib/geometry/boolean';
import type { Region } from '@/lib/geometry/contour';
import { regionContains } from '@/lib/geometry/measure';
import { regionPieces } from '@/lib/geometry/pieces';
import type { CutOf } from '@/lib/job/cut-schema';
import { cutterOf } from '@/lib/job/cut-values';
import type { Job } from '@/lib/job/job-schema';
import type { ResolvedOutlines } from '@/lib/outline/resolve-outlines';
import { runOutRegion } from '../../shared/run-out';

/** What a pocket asks for, in its face's view: its outlines combined even-odd, carried out over the board's edges. */
export function pocketArea(job: Job, cut: CutOf<'pocket'>, resolved: ResolvedOutlines): Region {
  const combined = evenOddRegions(cut.outlines.map((id) => resolved.get(id, cut.face).region));
  if (!cut.runOut) return combined;
  return runOutRegion(combined, job.board, cutterOf(job, cut).diameter / 2 + 1);
}

/** Pieces of an area that hold no place for the cutter's axis, `ground` being all such places of the area. */
export function unreachablePieces(area: Region, ground: Region): Region[] {
  return regionPieces(area).filter(
    (piece) => !ground.some(([place]) => place !== undefined && regionContains(piece, place)),
  );
}
