import type { CutMoves } from './cut-moves';
import type { ArcMove, Position } from './move';

/**
 * Minutes for a program's own comment: lengths over feeds, nothing lost at corners. The report's times come from the
 * proof, which accelerates; this one must be known before there is a text to prove.
 */
export function roughSeconds(
  steps: readonly CutMoves[],
  { rapid, controller }: { rapid: { xy: number; z: number }; controller: { spinUp: number } },
): number {
  let seconds = controller.spinUp;
  for (const { moves } of steps) {
    let at: Position | null = null;
    for (const move of moves) {
      if (move.kind === 'dwell') {
        seconds += move.seconds;
        continue;
      }
      const from: Position = at ?? move.to;
      if (move.kind === 'rapid')
        seconds += (60 * flat(from, move.to)) / rapid.xy + (60 * Math.abs(move.to.z - from.z)) / rapid.z;
      else seconds += (60 * (move.kind === 'arc' ? arcLength(from, move) : solid(from, move.to))) / move.feed;
      at = move.to;
    }
  }
  return seconds;
}

function flat(a: Position, b: Position): number {
  return Math.hypot(b.x - a.x, b.y - a.y);
}

function solid(a: Position, b: Position): number {
  return Math.hypot(flat(a, b), b.z - a.z);
}

function arcLength(from: Position, { to, cx, cy, ccw }: ArcMove): number {
  const a = Math.atan2(from.y - cy, from.x - cx);
  const b = Math.atan2(to.y - cy, to.x - cx);
  let turn = ccw ? b - a : a - b;
  if (turn <= 1e-9) turn += 2 * Math.PI;
  return Math.hypot(turn * Math.hypot(to.x - cx, to.y - cy), to.z - from.z);
}
