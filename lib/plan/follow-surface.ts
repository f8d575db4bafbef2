import type { Surface } from '@/lib/job/board-schema';
import type { ArcMove, FeedMove, Move, Position } from '@/lib/moves/move';
import type { BoardSize } from './shared/run-out';
import { arcBetween, subPiece, type ArcPiece } from './shared/track';
import { highestOf, surfaceHeight } from './surface-height';

type Measured = NonNullable<Surface>;

/** A move is divided until its straight change of height is this near to the surface, mm. */
const HEIGHT_ERROR = 0.01;

/** Stretches longer than this are looked at in parts: between two probes the surface may rise and fall again, mm. */
const LONGEST_STRETCH = 8;

/** No shorter stretches are made, mm. */
const SHORTEST_STRETCH = 0.2;

/**
 * Moves that follow a measured surface: every feed's z is moved by the measured height under it, long moves are divided
 * so that the error stays small. Rapids go over the highest place that was measured; a hollow never lowers them.
 */
export function followSurface(moves: readonly Move[], surface: Measured, board: BoardSize): Move[] {
  const height = (p: Position) => surfaceHeight(surface, board, p);
  const highest = highestOf(surface, board);
  const raised = (p: Position): Position => ({ ...p, z: p.z + height(p) });
  const out: Move[] = [];
  let at: Position | null = null;
  for (const move of moves) {
    switch (move.kind) {
      case 'dwell':
        out.push(move);
        continue;
      case 'rapid':
        out.push({ kind: 'rapid', to: { ...move.to, z: move.to.z + highest } });
        break;
      case 'feed':
        for (const to of lineStops(at ?? move.to, move, height)) out.push({ ...move, to: raised(to) });
        break;
      case 'arc':
        for (const to of arcStops(at ?? move.to, move, height)) out.push({ ...move, to: raised(to) });
    }
    at = move.to;
  }
  return out;
}

function lineStops(from: Position, { to }: FeedMove, height: (p: Position) => number): Position[] {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const place = (t: number): Position => ({
    x: from.x + (to.x - from.x) * t,
    y: from.y + (to.y - from.y) * t,
    z: from.z + (to.z - from.z) * t,
  });
  return stops(length, place, height, to);
}

function arcStops(from: Position, move: ArcMove, height: (p: Position) => number): Position[] {
  const arc: ArcPiece = arcBetween(from, move.to, { x: move.cx, y: move.cy }, move.ccw);
  const place = (t: number): Position => {
    const { to } = subPiece(arc, 0, arc.length * t);
    return { ...to, z: from.z + (move.to.z - from.z) * t };
  };
  return stops(arc.length, place, height, move.to);
}

/** Ends of the stretches of a move so that the height changes almost evenly within each. */
function stops(
  length: number,
  place: (t: number) => Position,
  height: (p: Position) => number,
  end: Position,
): Position[] {
  const out: Position[] = [];
  const divide = (a: number, b: number) => {
    const run = (b - a) * length;
    if (run > SHORTEST_STRETCH && (run > LONGEST_STRETCH || bends(a, b))) {
      divide(a, (a + b) / 2);
      divide((a + b) / 2, b);
    } else out.push(b >= 1 ? end : place(b));
  };
  const bends = (a: number, b: number): boolean => {
    const [ha, hb] = [height(place(a)), height(place(b))];
    return [0.25, 0.5, 0.75].some(
      (t) => Math.abs(height(place(a + (b - a) * t)) - (ha + (hb - ha) * t)) > HEIGHT_ERROR,
    );
  };
  divide(0, 1);
  return mergeLevel(out, place, height, end);
}

/** One move is enough where the surface is flat under all of it. */
function mergeLevel(
  found: Position[],
  place: (t: number) => Position,
  height: (p: Position) => number,
  end: Position,
): Position[] {
  const first = height(place(0));
  return found.every((p) => Math.abs(height(p) - first) < 1e-9) ? [end] : found;
}
