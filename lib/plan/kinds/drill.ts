import { regionCentroid } from '@/lib/geometry/measure';
import { regionPieces } from '@/lib/geometry/pieces';
import { orderTour } from '@/lib/geometry/tour';
import type { Vec } from '@/lib/geometry/vec';
import { cutFloor } from '@/lib/job/cut-values';
import type { ResolvedOutline } from '@/lib/outline/resolve-outlines';
import { planOf, startPlace, type CutPlan, type CutWork } from '../shared/cut-work';
import { createMoveWriter, type MoveWriter } from '../shared/move-writer';
import { plungeFindings } from '../shared/entry';

/** Drills at points and at the centres of closed outlines, with pecks and a dwell where they are asked for. */
export function planDrill(work: CutWork<'drill'>): CutPlan {
  const places = work.outlines.flatMap(placesOf);
  const writer = createMoveWriter(work.limits);
  const tour = orderTour(
    places.map((place) => ({ entry: place, exit: place })),
    startPlace(work),
  );
  for (const { index } of tour) drillAt(writer, work, places[index]!);
  const first = places[0];
  const findings = first ? plungeFindings(work, { angle: null }, first) : [];
  return planOf(work, writer.finish(), findings);
}

function placesOf(outline: ResolvedOutline): readonly Vec[] {
  return [...outline.points, ...regionPieces(outline.region).map(regionCentroid)];
}

function drillAt(writer: MoveWriter, work: CutWork<'drill'>, place: Vec): void {
  const { cut, job, limits } = work;
  const floor = cutFloor(job, cut);
  writer.travelTo(place);
  let depth = cut.start;
  while (cut.peck > 0 && depth + cut.peck < floor - 1e-9) {
    depth += cut.peck;
    writer.descendTo(-depth);
    writer.rapidTo(limits.approach);
  }
  writer.descendTo(-floor);
  writer.dwell(cut.dwell);
}
