import type { Vec } from '@/lib/geometry/vec';
import type { TrackPiece } from './track';

/** Unit vector of travel where a piece begins. */
export function startDirection(piece: TrackPiece): Vec {
  return piece.kind === 'line' ? chord(piece) : tangent(piece.startAngle, piece.sweep);
}

/** Unit vector of travel where a piece ends. */
export function endDirection(piece: TrackPiece): Vec {
  return piece.kind === 'line' ? chord(piece) : tangent(piece.startAngle + piece.sweep, piece.sweep);
}

function chord({ from, to, length }: TrackPiece): Vec {
  return { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
}

function tangent(angle: number, sweep: number): Vec {
  const sign = Math.sign(sweep);
  return { x: -Math.sin(angle) * sign, y: Math.cos(angle) * sign };
}
