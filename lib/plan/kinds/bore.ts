import { checkCancelled } from '@/lib/base/cancel';
import { orderTour } from '@/lib/geometry/tour';
import type { Vec } from '@/lib/geometry/vec';
import { cutFloor } from '@/lib/job/cut-values';
import type { Finding } from '@/lib/report/report';
import {
  cutFinding,
  cutName,
  figure,
  planOf,
  startPlace,
  type CutPlan,
  type CutWork,
} from '../shared/cut-work';
import { followRuns } from '../shared/height-run';
import { createMoveWriter, type MoveWriter } from '../shared/move-writer';
import { circlesOf, type Circle } from '../shared/outline-circles';
import { pointAt, trackOfCircle } from '../shared/track';

/** A first ring this share of the cutter's radius wide leaves no core in its middle. */
const FIRST_RING = 0.9;

/**
 * Bores circles on a helix of the asked pitch with a last full turn at depth; circles wider than two cutters in rings
 * from the inside out, so that the whole disc is cleared. Runs counter-clockwise, which is climb in a hole.
 */
export function planBore(work: CutWork<'bore'>): CutPlan {
  const { cutter } = work;
  const circles = work.outlines.flatMap((outline) => circlesOf(outline) ?? []);
  const findings: Finding[] = [];
  const radius = cutter.diameter / 2;
  const fitting = circles.filter((circle) => {
    if (circle.radius >= radius - 1e-6) return true;
    findings.push(tooLarge(work, circle));
    return false;
  });
  const writer = createMoveWriter(work.limits);
  const tour = orderTour(
    fitting.map(({ center }) => ({ entry: center, exit: center })),
    startPlace(work),
  );
  for (const { index } of tour) {
    checkCancelled(work.control);
    boreCircle(writer, work, fitting[index]!, findings);
  }
  return planOf(work, writer.finish(), findings);
}

function boreCircle(writer: MoveWriter, work: CutWork<'bore'>, circle: Circle, findings: Finding[]): void {
  const { cut, cutter, job, stepdown } = work;
  const floor = -cutFloor(job, cut);
  const pitch = cut.pitch ?? stepdown;
  const stepover = cutter.speeds.stepover * cutter.diameter;
  const rings = boreRings(circle.radius, cutter.diameter / 2, stepover);
  if (rings.length === 0) {
    if (!cutter.centreCutting) findings.push(plunges(work, circle.center));
    writer.travelTo(circle.center);
    writer.descendTo(floor);
    return;
  }
  rings.forEach((radius, i) => {
    const track = trackOfCircle(circle.center, radius, true);
    // Above every ring but the first the wood beside it is gone; the helix still starts at the top of the wood.
    if (i === 0) writer.travelTo(track.start);
    else writer.feedTo(pointAt(track, 0), -cut.start);
    writer.descendTo(-cut.start);
    const turns = Math.max(1, Math.ceil((-cut.start - floor) / pitch - 1e-9));
    followRuns(writer, track, [
      { from: 0, to: turns * track.length, zFrom: -cut.start, zTo: floor },
      { from: 0, to: track.length, zFrom: floor, zTo: floor },
    ]);
    if (i < rings.length - 1) writer.feedTo(pointAt(track, 0), -cut.start);
  });
}

/** Radii of the cutter's rings from inside out, none where the hole is as wide as the cutter. */
export function boreRings(hole: number, cutter: number, stepover: number): number[] {
  const last = hole - cutter;
  if (last < 1e-6) return [];
  const first = FIRST_RING * cutter;
  if (last <= first) return [last];
  const step = Math.min(stepover, cutter);
  const count = Math.ceil((last - first) / step - 1e-9);
  return Array.from({ length: count + 1 }, (_, i) =>
    i === count ? last : first + ((last - first) * i) / count,
  );
}

function tooLarge(work: CutWork<'bore'>, { center, radius }: Circle): Finding {
  const message =
    `${cutName(work)}: ${work.cutter.name} (${figure(work.cutter.diameter)} mm) does not fit into a hole of ` +
    `${figure(2 * radius)} mm.`;
  return cutFinding(work, 'cutter-too-large', message, center);
}

function plunges(work: CutWork<'bore'>, at: Vec): Finding {
  const message = `${cutName(work)} must plunge, but ${work.cutter.name} does not cut at its centre.`;
  return cutFinding(work, 'no-centre-cut', message, at);
}
