import { checkCancelled } from '@/lib/base/cancel';
import type { Region } from '@/lib/geometry/contour';
import { regionPieces } from '@/lib/geometry/pieces';
import { descentAlong } from '../shared/entry';
import { followRuns } from '../shared/height-run';
import { zigzag } from '../shared/laps';
import { createLinkTest } from '../shared/links';
import type { MoveWriter } from '../shared/move-writer';
import { tracksOfRegion } from '../shared/outline-tracks';
import { rasterRows, toAndFro } from '../shared/raster-lines';
import { reverseTrack, trackOfLine, type Track } from '../shared/track';
import { comeDown, enterPass, linkTo } from './clear-ground';
import type { ClearingWork } from './enter-ground';

/**
 * Clears `ground` with parallel passes to and fro at `angle`, piece by piece and layer by layer, then along the walls.
 * What lies between two passes is within the cutter's reach of one of them or of the wall's pass.
 */
export function rasterGround(
  writer: MoveWriter,
  work: ClearingWork,
  ground: Region,
  angle: number,
  depths: readonly number[],
): void {
  for (const piece of regionPieces(ground)) {
    const mayLink = createLinkTest(piece);
    const lines = toAndFro(rasterRows(piece, angle, work.spacing)).map(({ from, to }) =>
      trackOfLine(from, to),
    );
    const walls = tracksOfRegion(piece).map((track) => {
      const wall = work.relieve ? work.relieve(track) : track;
      return work.conventional ? reverseTrack(wall) : wall;
    });
    let above = 0 - work.cut.start;
    for (const depth of depths) {
      checkCancelled(work.control);
      const z = -depth;
      const isDown = () => writer.position()?.z === z;
      lines.forEach((line) => {
        if (!isDown() || !linkTo(writer, line.start, mayLink)) enterLine(writer, work, line, above, z);
        followRuns(writer, line, [{ from: 0, to: line.length, zFrom: z, zTo: z }]);
      });
      for (const wall of walls) {
        const begin = isDown()
          ? enterPass(writer, work, wall, mayLink, above, z)
          : enterNew(writer, work, wall, above, z);
        followRuns(writer, wall, [{ from: begin, to: begin + wall.length, zFrom: z, zTo: z }]);
      }
      above = z;
    }
  }
}

/** Down at the start of a line on a ramp to and fro along it. */
function enterLine(writer: MoveWriter, work: ClearingWork, line: Track, above: number, z: number): void {
  comeDown(writer, line.start, above);
  const { angle } = descentAlong(work, work.entry, line.length);
  if (angle !== null) zigzag(writer, { track: line, tabs: [] }, above, z, angle);
  else writer.feedTo(line.start, z);
}

function enterNew(writer: MoveWriter, work: ClearingWork, wall: Track, above: number, z: number): number {
  return enterPass(writer, work, wall, () => false, above, z);
}
