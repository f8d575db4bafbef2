import { SAME_POINT } from '@/lib/base/tolerances';
import type { Vec } from '@/lib/geometry/vec';
import type { Move, Position } from '@/lib/moves/move';
import type { TrackPiece } from './track';

/** Heights above the nominal face and feeds that all moves of a cut use, mm and mm/min. */
export interface MoveLimits {
  /** Where the cutter travels. */
  readonly clearance: number;
  /** Where the plunge feed takes over from the rapid on the way down. */
  readonly approach: number;
  readonly feed: number;
  readonly plunge: number;
}

/**
 * Collects the moves of one cut and knows where the cutter is. All z are against the nominal face, negative below.
 * Rapids run level at the clearance, or straight up and down no lower than the approach height.
 */
export interface MoveWriter {
  /** Where the cutter stands; null before its first move. */
  position(): Position | null;
  /** Retract if down, then rapid to stand over `p`. */
  travelTo(p: Vec): void;
  /** Straight to `z` over the present place: down to the approach height rapidly, the rest at the plunge feed. */
  descendTo(z: number): void;
  /** Straight feed to `p` at `z`, no faster down than the plunge feed. */
  feedTo(p: Vec, z: number): void;
  /** Along joined pieces that begin where the cutter is, z changing evenly by length to `z`. */
  follow(pieces: readonly TrackPiece[], z: number): void;
  /** Straight up or down rapidly; the caller knows that nothing stands there. */
  rapidTo(z: number): void;
  dwell(seconds: number): void;
  /** Retracts and hands over the moves; none were made if the cutter never travelled. */
  finish(): Move[];
}

export function createMoveWriter(limits: MoveLimits): MoveWriter {
  const moves: Move[] = [];
  let at: Position | null = null;

  function push(move: Exclude<Move, { kind: 'dwell' }>): void {
    moves.push(move);
    at = move.to;
  }
  function rapid(to: Position): void {
    if (!at || !samePlace(at, to)) push({ kind: 'rapid', to });
  }
  function here(): Position {
    if (!at) throw new Error('The cutter must travel to its place first');
    return at;
  }
  function feedTo(p: Vec, z: number): void {
    const from = here();
    const to = { x: p.x, y: p.y, z };
    if (samePlace(from, to)) return;
    const feed = slopeFeed(limits, Math.hypot(p.x - from.x, p.y - from.y), z - from.z);
    push({ kind: 'feed', to, feed });
  }
  function rapidTo(z: number): void {
    rapid({ ...here(), z });
  }
  function follow(pieces: readonly TrackPiece[], zEnd: number): void {
    const zStart = here().z;
    const length = pieces.reduce((sum, piece) => sum + piece.length, 0);
    const feed = slopeFeed(limits, length, zEnd - zStart);
    let gone = 0;
    for (const piece of pieces) {
      gone += piece.length;
      const z = gone >= length - SAME_POINT ? zEnd : zStart + ((zEnd - zStart) * gone) / length;
      const to = { x: piece.to.x, y: piece.to.y, z };
      if (piece.kind === 'line') push({ kind: 'feed', to, feed });
      else push({ kind: 'arc', to, cx: piece.center.x, cy: piece.center.y, ccw: piece.sweep > 0, feed });
    }
  }

  return {
    position: () => at,
    travelTo(p) {
      if (at) rapidTo(limits.clearance);
      rapid({ x: p.x, y: p.y, z: limits.clearance });
    },
    descendTo(z) {
      const from = here();
      if (from.z > limits.approach) rapidTo(Math.max(limits.approach, z));
      const now = here();
      if (Math.abs(now.z - z) > SAME_POINT) push({ kind: 'feed', to: { ...now, z }, feed: limits.plunge });
    },
    feedTo,
    follow,
    rapidTo,
    dwell(seconds) {
      if (seconds > 0) moves.push({ kind: 'dwell', seconds });
    },
    finish() {
      if (at) rapidTo(limits.clearance);
      return moves;
    },
  };
}

/** The feed along a slope whose downward part does not exceed the plunge feed (F·sin γ ≤ plunge). */
function slopeFeed(limits: MoveLimits, run: number, rise: number): number {
  if (rise >= 0 && run > 0) return limits.feed;
  const steepness = Math.abs(rise) / Math.hypot(run, rise);
  return Math.min(limits.feed, limits.plunge / Math.max(steepness, 1e-9));
}

function samePlace(a: Position, b: Position): boolean {
  return (
    Math.abs(a.x - b.x) <= SAME_POINT &&
    Math.abs(a.y - b.y) <= SAME_POINT &&
    Math.abs(a.z - b.z) <= SAME_POINT
  );
}
