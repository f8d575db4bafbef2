import { SAME_POINT } from '@/lib/base/tolerances';
import type { Ring } from '@/lib/geometry/contour';
import { fitArcs, type PathPiece } from '@/lib/geometry/fit-arcs';
import { distance, lerp, subtract, type Vec } from '@/lib/geometry/vec';
import { ARC_FIT_TOLERANCE } from '@/lib/base/tolerances';

/** A straight run of a track. */
export interface LinePiece {
  readonly kind: 'line';
  readonly from: Vec;
  readonly to: Vec;
  readonly length: number;
}

/** A circular run of a track: from `startAngle` through `sweep` radians (positive = counter-clockwise) about `center`. */
export interface ArcPiece {
  readonly kind: 'arc';
  readonly from: Vec;
  readonly to: Vec;
  readonly length: number;
  readonly center: Vec;
  readonly radius: number;
  readonly startAngle: number;
  readonly sweep: number;
}

export type TrackPiece = LinePiece | ArcPiece;

/**
 * A path of the cutter's axis in the plane, lines and arcs, measured by its length from its start. A closed track ends
 * where it starts; places on it may be given beyond its length and then mean later laps.
 */
export interface Track {
  readonly start: Vec;
  readonly pieces: readonly TrackPiece[];
  /** Length from the start of the track to the start of each piece. */
  readonly offsets: readonly number[];
  readonly length: number;
  readonly closed: boolean;
}

/** The track through `points`, arcs found where the points lie on them within {@link ARC_FIT_TOLERANCE}. */
export function trackOfPoints(points: readonly Vec[], closed: boolean): Track {
  const start = points[0];
  if (!start) throw new Error('A track needs a point');
  if (points.length === 1) return trackOfPieces(start, [], false);
  const pieces = fitArcs(points, { closed, tolerance: ARC_FIT_TOLERANCE });
  return trackOfPathPieces(start, pieces, closed);
}

/** The closed track round a ring, in the ring's direction. */
export function trackOfRing(ring: Ring): Track {
  return trackOfPoints(ring, true);
}

/** A straight track. */
export function trackOfLine(from: Vec, to: Vec): Track {
  return trackOfPieces(from, [linePiece(from, to)], false);
}

/** A full circle from the point at `angle` radians. */
export function trackOfCircle(center: Vec, radius: number, ccw: boolean, angle = 0): Track {
  const piece = arcPiece(center, radius, angle, ccw ? 2 * Math.PI : -2 * Math.PI);
  return trackOfPieces(piece.from, [piece], true);
}

/** The track of fitted pieces that begin at `start`. */
export function trackOfPathPieces(start: Vec, pieces: readonly PathPiece[], closed: boolean): Track {
  const out: TrackPiece[] = [];
  let from = start;
  for (const piece of pieces) {
    if (piece.kind === 'line') {
      if (distance(from, piece.to) > SAME_POINT) out.push(linePiece(from, piece.to));
    } else out.push(arcBetween(from, piece.to, piece.center, piece.ccw));
    from = out.at(-1)?.to ?? from;
  }
  return trackOfPieces(start, out, closed && out.length > 0);
}

export function trackOfPieces(start: Vec, pieces: readonly TrackPiece[], closed: boolean): Track {
  const offsets: number[] = [];
  let length = 0;
  for (const piece of pieces) {
    offsets.push(length);
    length += piece.length;
  }
  return { start, pieces, offsets, length, closed };
}

export function linePiece(from: Vec, to: Vec): LinePiece {
  return { kind: 'line', from, to, length: distance(from, to) };
}

export function arcPiece(center: Vec, radius: number, startAngle: number, sweep: number): ArcPiece {
  return {
    kind: 'arc',
    from: onCircle(center, radius, startAngle),
    to: onCircle(center, radius, startAngle + sweep),
    length: radius * Math.abs(sweep),
    center,
    radius,
    startAngle,
    sweep,
  };
}

/** The arc between two points; equal points mean a full circle. */
export function arcBetween(from: Vec, to: Vec, center: Vec, ccw: boolean): ArcPiece {
  const radius = distance(from, center);
  const startAngle = Math.atan2(from.y - center.y, from.x - center.x);
  const endAngle = Math.atan2(to.y - center.y, to.x - center.x);
  let sweep = endAngle - startAngle;
  if (ccw && sweep <= 0) sweep += 2 * Math.PI;
  if (!ccw && sweep >= 0) sweep -= 2 * Math.PI;
  if (distance(from, to) <= SAME_POINT) sweep = ccw ? 2 * Math.PI : -2 * Math.PI;
  return { kind: 'arc', from, to, length: radius * Math.abs(sweep), center, radius, startAngle, sweep };
}

/** The point at length `at` from the start: clamped to an open track, wrapped round a closed one. */
export function pointAt(track: Track, at: number): Vec {
  const place = locate(track, at);
  return place ? pointOnPiece(place.piece, place.along) : track.start;
}

/** Unit vector of travel at length `at`; (1, 0) on a track without length. */
export function directionAt(track: Track, at: number): Vec {
  const place = locate(track, at);
  return place ? directionOnPiece(place.piece, place.along) : { x: 1, y: 0 };
}

/** The same track run the other way. */
export function reverseTrack(track: Track): Track {
  const pieces = track.pieces.map(reversePiece).reverse();
  return trackOfPieces(pieces[0]?.from ?? track.start, pieces, track.closed);
}

/** A closed track begun at length `at`; an open one is returned as it is. */
export function startTrackAt(track: Track, at: number): Track {
  if (!track.closed || track.length === 0) return track;
  const pieces = sliceTrack(track, at, at + track.length);
  return trackOfPieces(pieces[0]?.from ?? track.start, pieces, true);
}

/**
 * The pieces between two lengths, `from` ≤ `to`. A closed track may be sliced across its start and over several laps.
 */
export function sliceTrack(track: Track, from: number, to: number): TrackPiece[] {
  if (track.length === 0) return [];
  if (!track.closed) return slicePlain(track, Math.max(from, 0), Math.min(to, track.length));
  const out: TrackPiece[] = [];
  const firstLap = Math.floor(from / track.length);
  for (let lap = firstLap; lap * track.length < to - SAME_POINT; lap++) {
    const shift = lap * track.length;
    out.push(...slicePlain(track, Math.max(from - shift, 0), Math.min(to - shift, track.length)));
  }
  return out;
}

/** The place of the track nearest to `p`: its length from the start, the point, and how far it is. */
export function nearestOnTrack(track: Track, p: Vec): { at: number; point: Vec; distance: number } {
  let best = { at: 0, point: track.start, distance: distance(track.start, p) };
  track.pieces.forEach((piece, i) => {
    const along = nearestOnPiece(piece, p);
    const point = pointOnPiece(piece, along);
    const away = distance(point, p);
    if (away < best.distance) best = { at: track.offsets[i]! + along, point, distance: away };
  });
  return best;
}

/** Points on the track with chord errors up to `tolerance`; a closed track does not repeat its first point. */
export function trackPoints(track: Track, tolerance: number): Vec[] {
  const points = [track.start, ...track.pieces.flatMap((piece) => piecePoints(piece, tolerance))];
  if (track.closed && points.length > 1) points.pop();
  return points;
}

/** Points after a piece's start up to its end, with chord errors up to `tolerance`. */
export function piecePoints(piece: TrackPiece, tolerance: number): Vec[] {
  if (piece.kind === 'line') return [piece.to];
  const step = 2 * Math.acos(Math.max(0, 1 - tolerance / Math.max(piece.radius, tolerance)));
  const count = Math.max(1, Math.ceil(Math.abs(piece.sweep) / step));
  const inner = Array.from({ length: count - 1 }, (_, i) =>
    pointOnPiece(piece, (piece.length * (i + 1)) / count),
  );
  return [...inner, piece.to];
}

/** The part of a piece between two lengths along it. */
export function subPiece(piece: TrackPiece, from: number, to: number): TrackPiece {
  if (from <= 0 && to >= piece.length) return piece;
  const start = from <= 0 ? piece.from : pointOnPiece(piece, from);
  const end = to >= piece.length ? piece.to : pointOnPiece(piece, to);
  if (piece.kind === 'line') return linePiece(start, end);
  const perLength = piece.sweep / piece.length;
  return {
    ...piece,
    from: start,
    to: end,
    length: to - from,
    startAngle: piece.startAngle + perLength * from,
    sweep: perLength * (to - from),
  };
}

function slicePlain(track: Track, from: number, to: number): TrackPiece[] {
  const out: TrackPiece[] = [];
  for (let i = pieceIndex(track, from); i < track.pieces.length && track.offsets[i]! < to - SAME_POINT; i++) {
    const piece = track.pieces[i]!;
    const a = Math.max(0, from - track.offsets[i]!);
    const b = Math.min(piece.length, to - track.offsets[i]!);
    if (b - a > SAME_POINT) out.push(subPiece(piece, a, b));
  }
  return out;
}

function locate(track: Track, at: number): { piece: TrackPiece; along: number } | null {
  if (track.pieces.length === 0) return null;
  const wrapped = track.closed ? at - Math.floor(at / track.length) * track.length : at;
  const inside = Math.min(Math.max(wrapped, 0), track.length);
  const i = pieceIndex(track, inside);
  const piece = track.pieces[i]!;
  return { piece, along: Math.min(inside - track.offsets[i]!, piece.length) };
}

/** Index of the piece that holds length `at`: the last that starts at or before it. */
function pieceIndex(track: Track, at: number): number {
  let low = 0;
  let high = track.offsets.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if (track.offsets[middle]! <= at) low = middle;
    else high = middle - 1;
  }
  return low;
}

function pointOnPiece(piece: TrackPiece, along: number): Vec {
  if (piece.length === 0) return piece.from;
  const t = along / piece.length;
  if (piece.kind === 'line') return lerp(piece.from, piece.to, t);
  return onCircle(piece.center, piece.radius, piece.startAngle + piece.sweep * t);
}

function directionOnPiece(piece: TrackPiece, along: number): Vec {
  if (piece.kind === 'line') {
    const d = subtract(piece.to, piece.from);
    return { x: d.x / piece.length, y: d.y / piece.length };
  }
  const angle = piece.startAngle + (piece.sweep * along) / piece.length;
  const sign = Math.sign(piece.sweep);
  return { x: -Math.sin(angle) * sign, y: Math.cos(angle) * sign };
}

function nearestOnPiece(piece: TrackPiece, p: Vec): number {
  if (piece.kind === 'line') {
    const d = subtract(piece.to, piece.from);
    const t = ((p.x - piece.from.x) * d.x + (p.y - piece.from.y) * d.y) / (piece.length * piece.length);
    return Math.min(Math.max(t, 0), 1) * piece.length;
  }
  const angle = Math.atan2(p.y - piece.center.y, p.x - piece.center.x);
  const turn = (angle - piece.startAngle) * Math.sign(piece.sweep);
  const ahead = turn - Math.floor(turn / (2 * Math.PI)) * 2 * Math.PI;
  if (ahead <= Math.abs(piece.sweep)) return ahead * piece.radius;
  return distance(p, piece.from) <= distance(p, piece.to) ? 0 : piece.length;
}

function reversePiece(piece: TrackPiece): TrackPiece {
  if (piece.kind === 'line') return { ...piece, from: piece.to, to: piece.from };
  return {
    ...piece,
    from: piece.to,
    to: piece.from,
    startAngle: piece.startAngle + piece.sweep,
    sweep: -piece.sweep,
  };
}

function onCircle(center: Vec, radius: number, angle: number): Vec {
  return { x: center.x + radius * Math.cos(angle), y: center.y + radius * Math.sin(angle) };
}
