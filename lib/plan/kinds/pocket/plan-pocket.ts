import { checkCancelled } from '@/lib/base/cancel';
import type { Region } from '@/lib/geometry/contour';
import { insetRegion } from '../../shared/inset-region';
import { regionPieces } from '@/lib/geometry/pieces';
import { orderTour } from '@/lib/geometry/tour';
import { cutFloor } from '@/lib/job/cut-values';
import type { Finding } from '@/lib/report/report';
import { cutFinding, cutName, planOf, startPlace, type CutPlan, type CutWork } from '../../shared/cut-work';
import { followRuns } from '../../shared/height-run';
import { layerDepths } from '../../shared/layers';
import { createLinkTest, type LinkTest } from '../../shared/links';
import { createMoveWriter, type MoveWriter } from '../../shared/move-writer';
import { tracksOfRegion } from '../../shared/outline-tracks';
import { reverseTrack, type Track } from '../../shared/track';
import { comeDown, enterPass, linkTo } from './clear-ground';
import { cutRest } from './cut-rest';
import { chooseEntry, entryFindings, entryPlace, goDown } from './enter-ground';
import { insetPieces } from './inset-rings';
import { passesInsideOut } from './pass-order';
import { pocketArea, unreachablePieces } from './pocket-area';

type PocketWork = CutWork<'pocket'>;

/** One piece of ground of a pocket with its passes, in cutting order. */
interface GroundPasses {
  readonly region: Region;
  readonly passes: readonly Track[];
  readonly entry: ReturnType<typeof chooseEntry>;
  readonly mayLink: LinkTest;
}

/**
 * Clears an area to a flat floor in layers of equal thickness, each from its middle outward with the walls last.
 * Between passes the cutter stays down wherever the straight way keeps its axis within the ground.
 */
export function planPocket(work: PocketWork): CutPlan {
  const { job, cut, cutter } = work;
  const radius = cutter.diameter / 2;
  const area = pocketArea(job, cut, work.resolved);
  const findings = [...doesNotFit(work, area, radius + cut.allowance)];
  const depths = layerDepths(cut.start, cutFloor(job, cut), work.stepdown);
  const ground = insetRegion(area, radius + cut.allowance);
  const writer = createMoveWriter(work.limits);
  if (cut.rest === null) findings.push(...clearGround(writer, work, ground, depths));
  else cutRest(writer, work, area, ground, depths);
  if (cut.finish && cut.allowance > 0) {
    finishWalls(writer, work, insetRegion(area, radius), depths.at(-1)!);
  }
  return planOf(work, writer.finish(), findings);
}

function clearGround(
  writer: MoveWriter,
  work: PocketWork,
  ground: Region,
  depths: readonly number[],
): Finding[] {
  const pieces = groundPasses(work, ground, depths[0]! - work.cut.start);
  const findings: Finding[] = [];
  const tour = orderTour(
    pieces.map(({ entry }) => ({ entry: entryPlace(entry), exit: entryPlace(entry) })),
    startPlace(work),
  );
  for (const { index } of tour) {
    const piece = pieces[index]!;
    findings.push(...entryFindings(work, piece.entry));
    clearPiece(writer, work, piece, depths);
  }
  return findings;
}

function groundPasses(work: PocketWork, ground: Region, firstLayer: number): GroundPasses[] {
  const { cut, cutter, control } = work;
  const stepover = (cut.stepover ?? cutter.speeds.stepover) * cutter.diameter;
  return insetPieces(ground, stepover, cutter.diameter / 2, control).map((piece) => {
    const passes = passesInsideOut(piece, cut.direction === 'conventional');
    const mayLink = createLinkTest(piece.region);
    const entry = chooseEntry(work, piece, passes, mayLink, firstLayer);
    return { region: piece.region, passes, entry, mayLink };
  });
}

function clearPiece(
  writer: MoveWriter,
  work: PocketWork,
  { passes, entry, mayLink }: GroundPasses,
  depths: readonly number[],
): void {
  let above = -work.cut.start;
  depths.forEach((depth, layer) => {
    checkCancelled(work.control);
    const z = -depth;
    // On the first layer the wood still stands, so the cutter comes from above.
    if (layer === 0 || !linkTo(writer, entryPlace(entry), mayLink))
      comeDown(writer, entryPlace(entry), above);
    const onFirst = entry.kind === 'along' && entry.track === passes[0];
    let begin = goDown(writer, entry, above, z, !onFirst);
    passes.forEach((pass, i) => {
      if (i > 0 || !onFirst) begin = enterPass(writer, work, pass, mayLink, above, z);
      followRuns(writer, pass, [{ from: begin, to: begin + pass.length, zFrom: z, zTo: z }]);
    });
    above = z;
  });
}

/** A last pass along the walls themselves at full depth. */
function finishWalls(writer: MoveWriter, { cut, control }: PocketWork, ground: Region, depth: number): void {
  for (const piece of regionPieces(ground)) {
    checkCancelled(control);
    const mayLink = createLinkTest(piece);
    for (const ring of tracksOfRegion(piece)) {
      const track = cut.direction === 'conventional' ? reverseTrack(ring) : ring;
      if (!linkTo(writer, track.start, mayLink)) comeDown(writer, track.start, -depth);
      followRuns(writer, track, [{ from: 0, to: track.length, zFrom: -depth, zTo: -depth }]);
    }
  }
}

function doesNotFit(work: PocketWork, area: Region, radius: number): Finding[] {
  return unreachablePieces(area, radius).map((piece) => {
    const at = piece[0]?.[0];
    const message = `${cutName(work)}: ${work.cutter.name} does not fit into this part of the pocket.`;
    return cutFinding(work, 'cutter-too-large', message, at);
  });
}
