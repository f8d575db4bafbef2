import { checkCancelled } from '@/lib/base/cancel';
import type { Region } from '@/lib/geometry/contour';
import { orderTour } from '@/lib/geometry/tour';
import type { Vec } from '@/lib/geometry/vec';
import type { Finding } from '@/lib/report/report';
import { startPlace } from '../shared/cut-work';
import { descentAlong } from '../shared/entry';
import { followRuns } from '../shared/height-run';
import { createLinkTest, type LinkTest } from '../shared/links';
import type { MoveWriter } from '../shared/move-writer';
import type { Track } from '../shared/track';
import { chooseEntry, entryFindings, entryPlace, goDown, type ClearingWork } from './enter-ground';
import { insetPieces } from './inset-rings';
import { passesInsideOut } from './pass-order';

/** One piece of ground with its passes, in cutting order. */
interface GroundPasses {
  readonly region: Region;
  readonly passes: readonly Track[];
  readonly entry: ReturnType<typeof chooseEntry>;
  readonly mayLink: LinkTest;
}

/**
 * Clears `ground` (where the cutter's axis may be) layer by layer to `depths`, piece by piece, each from its middle
 * outward with the walls last.
 */
export function clearGround(
  writer: MoveWriter,
  work: ClearingWork,
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

function groundPasses(work: ClearingWork, ground: Region, firstLayer: number): GroundPasses[] {
  const { cutter, control } = work;
  return insetPieces(ground, work.spacing, cutter.diameter / 2, control).map((piece) => {
    const passes = passesInsideOut(piece, work.conventional, work.relieve);
    const mayLink = createLinkTest(piece.region);
    const entry = chooseEntry(work, piece, passes, mayLink, firstLayer);
    return { region: piece.region, passes, entry, mayLink };
  });
}

function clearPiece(
  writer: MoveWriter,
  work: ClearingWork,
  { passes, entry, mayLink }: GroundPasses,
  depths: readonly number[],
): void {
  let above = 0 - work.cut.start;
  depths.forEach((depth, layer) => {
    checkCancelled(work.control);
    const z = -depth;
    // On the first layer the wood still stands, so the cutter comes from above.
    if (layer === 0 || !linkTo(writer, entryPlace(entry), mayLink)) {
      comeDown(writer, entryPlace(entry), above);
    }
    const onFirst = entry.kind === 'along' && entry.track === passes[0];
    let begin = goDown(writer, entry, above, z, !onFirst);
    passes.forEach((pass, i) => {
      if (i > 0 || !onFirst) begin = enterPass(writer, work, pass, mayLink, above, z);
      followRuns(writer, pass, [{ from: begin, to: begin + pass.length, zFrom: z, zTo: z }]);
    });
    above = z;
  });
}

/** To a pass: straight where that stays within the ground, else over the board and down a ramp along the pass itself. */
export function enterPass(
  writer: MoveWriter,
  work: ClearingWork,
  pass: Track,
  mayLink: LinkTest,
  above: number,
  z: number,
): number {
  if (linkTo(writer, pass.start, mayLink)) return 0;
  comeDown(writer, pass.start, above);
  const descent = descentAlong(work, work.entry, pass.length);
  return goDown(writer, { kind: 'along', track: pass, descent }, above, z, false);
}

/** Straight to a place at the present depth, where the way stays within the ground. */
export function linkTo(writer: MoveWriter, to: Vec, mayLink: LinkTest): boolean {
  const at = writer.position();
  if (!at || !mayLink(at, to)) return false;
  writer.feedTo(to, at.z);
  return true;
}

/** Over the board to a place and down to `z`, rapidly only above the face. */
export function comeDown(writer: MoveWriter, to: Vec, z: number): void {
  writer.travelTo(to);
  writer.descendTo(z);
}
