import { cross, dot } from '@/lib/geometry/vec';
import { endDirection, startDirection } from '../shared/piece-direction';
import { sliceTrack, type Track, type TrackPiece } from '../shared/track';

/** Joints that turn by less than this (radians) come of fitting, not of a corner. */
const SMOOTH_JOINT = 0.02;

/** Stands for the curvature of a corner: sharper than any arc. */
const CORNER = 1e3;

/**
 * The sharpest bend of a track within `reach` of a place, as 1/radius in 1/mm: 0 where it is straight, far beyond any
 * arc where it has a corner. An arc counts by the tighter of its own radius and that of the outline `offset` inside it.
 */
export function bendAround(track: Track, at: number, reach: number, offset: number): number {
  const pieces = sliceTrack(track, at - reach, at + reach);
  return pieces.reduce((worst, piece, i) => {
    const joint = i > 0 ? turnBetween(pieces[i - 1]!, piece) : 0;
    return Math.max(worst, pieceBend(piece, offset), joint > SMOOTH_JOINT ? CORNER + joint : 0);
  }, 0);
}

function pieceBend(piece: TrackPiece, offset: number): number {
  if (piece.kind === 'line') return 0;
  return 1 / Math.max(1e-3, piece.radius - offset);
}

function turnBetween(a: TrackPiece, b: TrackPiece): number {
  const from = endDirection(a);
  const to = startDirection(b);
  return Math.abs(Math.atan2(cross(from, to), dot(from, to)));
}
