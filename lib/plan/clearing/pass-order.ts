import { distance, type Vec } from '@/lib/geometry/vec';
import { tracksOfRegion } from '../shared/outline-tracks';
import { nearestOnTrack, reverseTrack, startTrackAt, trackOfRing, type Track } from '../shared/track';
import type { InsetPiece } from './inset-rings';

/**
 * The closed passes of one piece of ground from its innermost outward, each begun where it is nearest to the end of
 * the one before; the walls come last.
 */
export function passesInsideOut(
  piece: InsetPiece,
  conventional: boolean,
  relieve: (track: Track) => Track = (track) => track,
): Track[] {
  const out: Track[] = [];
  clearWithin(piece, conventional, out);
  appendNearest(tracksOfRegion(piece.region).map(relieve), conventional, out);
  return out;
}

function visit(piece: InsetPiece, conventional: boolean, out: Track[]): void {
  clearWithin(piece, conventional, out);
  appendNearest(tracksOfRegion(piece.region), conventional, out);
}

/** What lies deeper than a piece's own boundary. */
function clearWithin(piece: InsetPiece, conventional: boolean, out: Track[]): void {
  const waiting = [...piece.inner];
  while (waiting.length > 0) {
    const next = nearestPiece(waiting, out.at(-1)?.start);
    visit(next, conventional, out);
    waiting.splice(waiting.indexOf(next), 1);
  }
  appendNearest(piece.spots.map(trackOfRing), conventional, out);
}

function nearestPiece(pieces: readonly InsetPiece[], from: Vec | undefined): InsetPiece {
  if (!from) return pieces[0]!;
  const away = ({ region }: InsetPiece) =>
    Math.min(...region.flatMap((ring) => ring.map((p) => distance(p, from))));
  return pieces.reduce((best, piece) => (away(piece) < away(best) ? piece : best));
}

/** Adds tracks one by one, always the nearest, in the asked direction: areas lie left of their rings, which is climb. */
function appendNearest(tracks: readonly Track[], conventional: boolean, out: Track[]): void {
  const waiting = tracks.map((track) => (conventional ? reverseTrack(track) : track));
  while (waiting.length > 0) {
    const from = out.at(-1)?.start ?? waiting[0]!.start;
    const places = waiting.map((track) => nearestOnTrack(track, from));
    const best = places.reduce(
      (least, place, i) => (place.distance < places[least]!.distance ? i : least),
      0,
    );
    out.push(startTrackAt(waiting[best]!, places[best]!.at));
    waiting.splice(best, 1);
  }
}
