import { checkCancelled } from '@/lib/base/cancel';
import type { Region } from '@/lib/geometry/contour';
import { regionPieces } from '@/lib/geometry/pieces';
import { cutFloor } from '@/lib/job/cut-values';
import type { Finding } from '@/lib/report/report';
import { clearGround, comeDown, linkTo } from '../../clearing/clear-ground';
import type { ClearingWork } from '../../clearing/enter-ground';
import { rasterGround } from '../../clearing/raster-ground';
import { cutFinding, cutName, planOf, type CutPlan, type CutWork } from '../../shared/cut-work';
import { relieveCorners, wallsOf } from '../../shared/corner-relief';
import { followRuns } from '../../shared/height-run';
import { insetRegion } from '../../shared/inset-region';
import { layerDepths } from '../../shared/layers';
import { createLinkTest } from '../../shared/links';
import { createMoveWriter, type MoveWriter } from '../../shared/move-writer';
import { tracksOfRegion } from '../../shared/outline-tracks';
import { reverseTrack, type Track } from '../../shared/track';
import { cutRest } from './cut-rest';
import { pocketArea, unreachablePieces } from './pocket-area';

type PocketWork = CutWork<'pocket'>;

/**
 * Clears an area to a flat floor in layers of equal thickness, each from its middle outward with the walls last.
 * Between passes the cutter stays down wherever the straight way keeps its axis within the ground.
 */
export function planPocket(work: PocketWork): CutPlan {
  const { job, cut, cutter } = work;
  const radius = cutter.diameter / 2;
  const area = pocketArea(job, cut, work.resolved);
  const depths = layerDepths(cut.start, cutFloor(job, cut), work.stepdown);
  const ground = insetRegion(area, radius + cut.allowance);
  const findings = doesNotFit(work, area, ground);
  const clearing: ClearingWork = {
    ...work,
    entry: cut.entry,
    spacing: (cut.stepover ?? cutter.speeds.stepover) * cutter.diameter,
    conventional: cut.direction === 'conventional',
    ...(cut.relief === 'dogbone' && { relieve: reliefOf(area, radius + cut.allowance) }),
  };
  const writer = createMoveWriter(work.limits);
  if (cut.rest !== null) cutRest(writer, clearing, cut, area, ground, depths);
  else if (cut.pattern === 'raster') rasterGround(writer, clearing, ground, cut.angle, depths);
  else findings.push(...clearGround(writer, clearing, ground, depths));
  if (cut.finish) {
    const relieve = cut.relief === 'dogbone' ? reliefOf(area, radius) : (track: Track) => track;
    finishWalls(writer, work, insetRegion(area, radius), relieve, depths.at(-1)!);
  }
  return planOf(work, writer.finish(), findings);
}

/** Detours into the corners of the area; along its ground's rings they turn left. */
function reliefOf(area: Region, radius: number): (track: Track) => Track {
  const walls = wallsOf(area);
  return (track) => relieveCorners(track, 'left', radius, walls);
}

/** A last pass along the walls themselves at full depth. */
function finishWalls(
  writer: MoveWriter,
  { cut, control }: PocketWork,
  ground: Region,
  relieve: (track: Track) => Track,
  depth: number,
): void {
  for (const piece of regionPieces(ground)) {
    checkCancelled(control);
    const mayLink = createLinkTest(piece);
    for (const ring of tracksOfRegion(piece).map(relieve)) {
      const track = cut.direction === 'conventional' ? reverseTrack(ring) : ring;
      if (!linkTo(writer, track.start, mayLink)) comeDown(writer, track.start, -depth);
      followRuns(writer, track, [{ from: 0, to: track.length, zFrom: -depth, zTo: -depth }]);
    }
  }
}

function doesNotFit(work: PocketWork, area: Region, ground: Region): Finding[] {
  return unreachablePieces(area, ground).map((piece) => {
    const at = piece[0]?.[0];
    const message = `${cutName(work)}: ${work.cutter.name} does not fit into this part of the pocket.`;
    return cutFinding(work, 'cutter-too-large', message, at);
  });
}
