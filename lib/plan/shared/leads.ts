import type { Lead } from '@/lib/job/cut-schema';
import { add, leftOf, rotate, scale, type Vec } from '@/lib/geometry/vec';
import { arcPiece, directionAt, linePiece, pointAt, type Track, type TrackPiece } from './track';

/** Ways onto a track and off it again at one place; both begin or end in the waste beside it. */
export interface LeadPieces {
  readonly start: Vec;
  readonly onto: readonly TrackPiece[];
  readonly off: readonly TrackPiece[];
}

/**
 * Leads at length `at` of a track: a straight line from the waste side, or a quarter circle that meets the track
 * without a corner; `length` is the line's, or the arc's radius. `wasteOnLeft`: on which side of the travel waste lies.
 */
export function leadsAt(track: Track, at: number, { type, length }: Lead, wasteOnLeft: boolean): LeadPieces {
  const place = pointAt(track, at);
  const ahead = directionAt(track, at);
  const aside = scale(leftOf(ahead), wasteOnLeft ? 1 : -1);
  if (type === 'line') {
    const start = add(place, scale(aside, length));
    return { start, onto: [linePiece(start, place)], off: [linePiece(place, start)] };
  }
  const center = add(place, scale(aside, length));
  // On the circle about `center` the track's place lies at −aside; a quarter before and after it the leads begin and end.
  const inward = scale(aside, -1);
  const turn = wasteOnLeft ? 1 : -1;
  const angle = Math.atan2(inward.y, inward.x);
  const quarter = (Math.PI / 2) * turn;
  const start = add(center, scale(rotate(inward, -quarter), length));
  return {
    start,
    onto: [arcPiece(center, length, angle - quarter, quarter)],
    off: [arcPiece(center, length, angle, quarter)],
  };
}
