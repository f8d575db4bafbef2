import type { Vec } from '@/lib/geometry/vec';
import type { CutWork } from '../../shared/cut-work';
import { descentAlong } from '../../shared/entry';
import type { LinkTest } from '../../shared/links';
import type { MoveWriter } from '../../shared/move-writer';
import type { Track } from '../../shared/track';
import { goDown } from './enter-ground';

/** To a pass: straight where that stays within the ground, else over the board and down a ramp along the pass itself. */
export function enterPass(
  writer: MoveWriter,
  work: CutWork<'pocket'>,
  pass: Track,
  mayLink: LinkTest,
  above: number,
  z: number,
): number {
  if (linkTo(writer, pass.start, mayLink)) return 0;
  comeDown(writer, pass.start, above);
  const descent = descentAlong(work, work.cut.entry, pass.length);
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
