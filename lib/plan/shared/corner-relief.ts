import { cross, distance, dot, subtract, type Vec } from '@/lib/geometry/vec';
import { linePiece, trackOfPieces, type Track, type TrackPiece } from './track';
import { endDirection, startDirection } from './piece-direction';

/** Joints that turn by less than this are no corners (radians). */
const LEAST_CORNER = 0.2;

/** How far from a place the wall is in a direction, mm; infinite where there is none. */
export type WallAhead = (from: Vec, direction: Vec) => number;

/**
 * A track with a detour into every sharp corner that turns to `side`, out along the corner's bisector until the cutter's
 * edge just touches the wall's own corner, and back: a square part then fits. For a corner of angle φ that is
 * r·(1 / sin(φ/2) − 1) (check value C042 gives 0.4142 r for 90°); rounded corners need less, found by `wallAhead`.
 */
export function relieveCorners(
  track: Track,
  side: 'left' | 'right',
  radius: number,
  wallAhead: WallAhead,
): Track {
  if (!track.closed) return track;
  const pieces = track.pieces.flatMap((piece, i): TrackPiece[] => {
    const next = track.pieces[(i + 1) % track.pieces.length]!;
    const tip = reliefTip(piece, next, side, radius, wallAhead);
    return tip ? [piece, linePiece(piece.to, tip), linePiece(tip, piece.to)] : [piece];
  });
  return trackOfPieces(track.start, pieces, true);
}

function reliefTip(
  piece: TrackPiece,
  next: TrackPiece,
  side: 'left' | 'right',
  radius: number,
  wallAhead: WallAhead,
): Vec | null {
  const u = endDirection(piece);
  const v = startDirection(next);
  const turn = Math.atan2(cross(u, v), dot(u, v));
  if ((side === 'left' ? turn : -turn) < LEAST_CORNER) return null;
  const out = subtract(u, v);
  const size = Math.hypot(out.x, out.y);
  const direction = { x: out.x / size, y: out.y / size };
  const reach = wallAhead(piece.to, direction) - radius;
  if (!Number.isFinite(reach) || reach < 1e-3) return null;
  return { x: piece.to.x + direction.x * reach, y: piece.to.y + direction.y * reach };
}

/** A {@link WallAhead} for the edges of rings. */
export function wallsOf(rings: readonly (readonly Vec[])[]): WallAhead {
  return (from, direction) => {
    let least = Infinity;
    for (const ring of rings) {
      ring.forEach((a, i) => {
        const b = ring[(i + 1) % ring.length]!;
        const hit = rayHits(from, direction, a, b);
        if (hit < least) least = hit;
      });
    }
    return least;
  };
}

function rayHits(from: Vec, direction: Vec, a: Vec, b: Vec): number {
  const ab = subtract(b, a);
  const across = cross(direction, ab);
  if (Math.abs(across) < 1e-12) return Infinity;
  const fa = subtract(a, from);
  const t = cross(fa, ab) / across;
  const s = cross(fa, direction) / across;
  // A hair beyond the edge's ends: the ray goes straight at the corner where two edges meet.
  const slack = 1e-6 / Math.max(distance(a, b), 1e-6);
  return t >= 0 && s >= -slack && s <= 1 + slack ? t : Infinity;
}
