import { checkCancelled } from '@/lib/base/cancel';
import type { Region } from '@/lib/geometry/contour';
import { orderTour } from '@/lib/geometry/tour';
import { distance } from '@/lib/geometry/vec';
import type { CutOf } from '@/lib/job/cut-schema';
import { followRuns } from '../../shared/height-run';
import { createLinkTest } from '../../shared/links';
import type { MoveWriter } from '../../shared/move-writer';
import { trackEnd } from '../../shared/order-tracks';
import { reverseTrack } from '../../shared/track';
import { comeDown, enterPass, linkTo } from '../../clearing/clear-ground';
import type { ClearingWork } from '../../clearing/enter-ground';
import { leavingsOf } from './leavings';
import { restPasses } from '../../clearing/rest-passes';

/** A longer way at depth than this many cutter diameters takes longer than going over the board. */
const LONGEST_LINK = 5;

/** Cuts what an earlier pocket had to leave, place by place, each in all its layers. */
export function cutRest(
  writer: MoveWriter,
  work: ClearingWork,
  cut: CutOf<'pocket'>,
  area: Region,
  ground: Region,
  depths: readonly number[],
): void {
  const { job, cutter, resolved, control } = work;
  const earlier = job.cuts.find(({ id }) => id === cut.rest);
  if (earlier?.kind !== 'pocket') throw new Error(`No earlier pocket '${cut.rest}'`);
  const radius = cutter.diameter / 2;
  const leavings = leavingsOf(job, earlier, area, radius, resolved);
  const places = restPasses(ground, leavings, radius, work.spacing, control).filter(
    (passes) => passes.length > 0,
  );
  const mayLink = createLinkTest(ground);
  const stops = places.map((passes) => ({ entry: passes[0]!.start, exit: trackEnd(passes.at(-1)!) }));
  for (const { index } of orderTour(stops, writer.position() ?? stops[0]?.entry ?? { x: 0, y: 0 })) {
    let above = 0 - cut.start;
    for (const depth of depths) {
      checkCancelled(control);
      for (const pass of places[index]!.map((track) => (work.conventional ? reverseTrack(track) : track))) {
        if (pass.closed) {
          const begin = enterPass(writer, work, pass, mayLink, above, -depth);
          followRuns(writer, pass, [{ from: begin, to: begin + pass.length, zFrom: -depth, zTo: -depth }]);
          continue;
        }
        // An open pass begins where the earlier cutter has been, so the cutter may go straight down there.
        const at = writer.position();
        const isNear = at !== null && distance(at, pass.start) < LONGEST_LINK * cutter.diameter;
        if (isNear && linkTo(writer, pass.start, mayLink)) writer.feedTo(pass.start, -depth);
        else comeDown(writer, pass.start, -depth);
        followRuns(writer, pass, [{ from: 0, to: pass.length, zFrom: -depth, zTo: -depth }]);
      }
      above = -depth;
    }
  }
}
