import { checkCancelled } from '@/lib/base/cancel';
import { DEGREES } from '@/lib/geometry/vec';
import type { Cutter } from '@/lib/job/machine-schema';
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
import { descentAlong, plungeFindings } from '../shared/entry';
import { cutLaps } from '../shared/laps';
import { growRegion, insetRegion } from '../shared/inset-region';
import { layerDepths } from '../shared/layers';
import { createMoveWriter } from '../shared/move-writer';
import { narrowOpenings } from '../shared/narrow-openings';
import { orderInsideOut } from '../shared/order-tracks';
import { tracksOfRegion } from '../shared/outline-tracks';
import { reverseTrack } from '../shared/track';

/** A bevel's path: how deep the point runs below the start, and how far beside the outline, mm. */
export interface BevelPath {
  readonly depth: number;
  readonly offset: number;
}

/**
 * Depth w / tan α + beneath, offset beneath · tan α + f / 2 (f: diameter of the flat at the point, α: half the included
 * angle); elementary geometry. The cone then meets the outline at the bevel's lower edge and the face at its width.
 */
export function bevelPath(
  cutter: Extract<Cutter, { kind: 'vbit' }>,
  width: number,
  beneath: number,
): BevelPath {
  const slope = Math.tan((cutter.angle / 2) * DEGREES);
  return { depth: width / slope + beneath, offset: beneath * slope + cutter.tip / 2 };
}

/**
 * Bevels the edges of outlines with a V-bit: within them for `outside`, beyond them for `inside`, holes included. Every
 * place of the path keeps the offset from all of the outline, so the cone cuts into no reflex corner.
 */
export function planChamfer(work: CutWork<'chamfer'>): CutPlan {
  const { cut, cutter } = work;
  if (cutter.kind !== 'vbit') throw new Error(`A chamfer with a ${cutter.kind} cutter`);
  const { depth, offset } = bevelPath(cutter, cut.width, cut.beneath);
  if (cut.width + offset > cutter.diameter / 2 + 1e-9) return planOf(work, [], [tooSmall(work, offset)]);

  const findings: Finding[] = [];
  const lines = work.outlines.flatMap((outline) => {
    checkCancelled(work.control);
    const outside = cut.side === 'outside';
    const region = outside ? growRegion(outline.region, offset) : insetRegion(outline.region, offset);
    for (const opening of narrowOpenings(outline.region, cut.side, offset)) {
      const message = `${cutName(work)}: the point of ${cutter.name} does not fit into an opening of '${outline.name}'.`;
      findings.push(cutFinding(work, 'cutter-too-large', message, opening[0]?.[0]));
    }
    // The wood that stays lies left of an outer ring for `outside`; climb wants it on the right.
    return tracksOfRegion(region).map((track) => ({ track: outside ? reverseTrack(track) : track }));
  });

  const writer = createMoveWriter(work.limits);
  const floor = cut.start + depth;
  const layers = layerDepths(cut.start, floor, cut.stepdown ?? floor);
  for (const { track } of orderInsideOut(lines, startPlace(work))) {
    const descent = descentAlong(work, { type: 'plunge', angle: 5 }, track.length);
    findings.push(...plungeFindings(work, descent, track.start));
    cutLaps(writer, { track, top: cut.start, layers, descent, tabs: [] });
  }
  return planOf(work, writer.finish(), findings);
}

function tooSmall(work: CutWork<'chamfer'>, offset: number): Finding {
  const needed = 2 * (work.cut.width + offset);
  const message =
    `${cutName(work)}: a bevel ${figure(work.cut.width)} mm wide needs a V-bit of ${figure(needed)} mm; ` +
    `${work.cutter.name} has ${figure(work.cutter.diameter)} mm.`;
  return cutFinding(work, 'cutter-too-small', message, work.outlines[0]?.contours[0]?.start);
}
