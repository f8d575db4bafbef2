import { checkCancelled } from '@/lib/base/cancel';
import { orderTour } from '@/lib/geometry/tour';
import { cutFloor } from '@/lib/job/cut-values';
import { planOf, startPlace, type CutPlan, type CutWork } from '../shared/cut-work';
import { descentAlong, plungeFindings } from '../shared/entry';
import { followRuns } from '../shared/height-run';
import { cutLaps } from '../shared/laps';
import { layerDepths } from '../shared/layers';
import { createMoveWriter, type MoveWriter } from '../shared/move-writer';
import { trackEnd } from '../shared/order-tracks';
import { trackOfContour } from '../shared/outline-tracks';
import { reverseTrack, type Track } from '../shared/track';
import type { Finding } from '@/lib/report/report';

/** Cuts along the lines themselves, in layers; order and, on open lines, direction are chosen for little travel. */
export function planEngrave(work: CutWork<'engrave'>): CutPlan {
  const { cut, job, stepdown } = work;
  const tracks = work.outlines
    .flatMap(({ contours }) => contours.map(trackOfContour))
    .filter((t) => t.length > 0);
  const layers = layerDepths(cut.start, cutFloor(job, cut), stepdown);
  const stops = tracks.map((track) => ({
    entry: track.start,
    exit: trackEnd(track),
    reversible: !track.closed,
  }));
  const writer = createMoveWriter(work.limits);
  const findings: Finding[] = [];
  for (const { index, reversed } of orderTour(stops, startPlace(work))) {
    checkCancelled(work.control);
    const track = reversed ? reverseTrack(tracks[index]!) : tracks[index]!;
    const descent = descentAlong(work, { type: 'plunge', angle: 5 }, track.length);
    findings.push(...plungeFindings(work, descent, track.start));
    if (track.closed || descent.angle !== null)
      cutLaps(writer, { track, top: cut.start, layers, descent, tabs: [] });
    else cutToAndFro(writer, track, layers);
  }
  return planOf(work, writer.finish(), findings);
}

/** An open line layer by layer without lifting: forth on one layer, back on the next. */
function cutToAndFro(writer: MoveWriter, track: Track, layers: readonly number[]): void {
  writer.travelTo(track.start);
  layers.forEach((depth, i) => {
    const way = i % 2 === 0 ? track : reverseTrack(track);
    writer.descendTo(-depth);
    followRuns(writer, way, [{ from: 0, to: way.length, zFrom: -depth, zTo: -depth }]);
  });
}
