import { checkCancelled } from '@/lib/base/cancel';
import { unionRegions } from '@/lib/geometry/boolean';
import type { Region } from '@/lib/geometry/contour';
import { offsetRegion } from '@/lib/geometry/offset';
import { cutFloor } from '@/lib/job/cut-values';
import { planOf, type CutPlan, type CutWork } from '../shared/cut-work';
import { layerDepths } from '../shared/layers';
import { createLinkTest } from '../shared/links';
import { createMoveWriter } from '../shared/move-writer';
import { rasterRows, toAndFro } from '../shared/raster-lines';
import { rectangle } from '../shared/run-out';

/**
 * Planes the board, or the given outlines, with parallel passes to and fro that run out all round by the cutter's
 * radius + 1 mm, so that every entry is outside the wood of a whole board.
 */
export function planSurface(work: CutWork<'surface'>): CutPlan {
  const { cut, cutter, job } = work;
  const ground = offsetRegion(surfacedArea(work), cutter.diameter / 2 + 1, { corners: 'sharp' });
  const spacing = (cut.stepover ?? cutter.speeds.stepover) * cutter.diameter;
  const rows = rasterRows(ground, cut.angle, spacing);
  const mayLink = createLinkTest(ground);
  const writer = createMoveWriter(work.limits);
  for (const depth of layerDepths(cut.start, cutFloor(job, cut), work.stepdown)) {
    checkCancelled(work.control);
    toAndFro(rows).forEach(({ from, to }) => {
      const at = writer.position();
      if (at && at.z === -depth && mayLink(at, from)) writer.feedTo(from, -depth);
      else {
        writer.travelTo(from);
        writer.descendTo(-depth);
      }
      writer.feedTo(to, -depth);
    });
  }
  return planOf(work, writer.finish());
}

function surfacedArea({ job, outlines }: CutWork<'surface'>): Region {
  if (outlines.length > 0) return unionRegions(outlines.map(({ region }) => region));
  return [rectangle({ minX: 0, minY: 0, maxX: job.board.x, maxY: job.board.y })];
}
