import { RING_SIMPLIFY } from '@/lib/base/tolerances';
import type { Contour, Region, Ring, Segment } from '@/lib/geometry/contour';
import { fitArcs } from '@/lib/geometry/fit-arcs';
import { flattenContour } from '@/lib/geometry/flatten';
import { cross, distance, dot, subtract, type Vec } from '@/lib/geometry/vec';
import {
  arcBetween,
  linePiece,
  trackOfPathPieces,
  trackOfPieces,
  trackOfRing,
  type Track,
  type TrackPiece,
} from './track';

/** How far the arcs that stand for a drawn curve may lie from it, mm. */
const CURVE_FIT = 0.004;

/** Steps of a flattened curve turn by less than this, corners by more (radians). */
const LEAST_CORNER = 0.26;

/** The track along a drawn contour, in its drawn direction: lines and arcs exact, other curves within 0.006 mm. */
export function trackOfContour(contour: Contour): Track {
  const pieces: TrackPiece[] = [];
  let from = contour.start;
  for (const segment of contour.segments) {
    pieces.push(...piecesOfSegment(from, segment));
    from = segment.to;
  }
  const real = pieces.filter(({ length }) => length > 0);
  return trackOfPieces(contour.start, real, contour.closed && real.length > 0);
}

/** The tracks round a region's rings, each in the ring's direction and begun where a piece of it begins. */
export function tracksOfRegion(region: Region): Track[] {
  return region.filter((ring) => ring.length > 2).map((ring) => trackOfRing(fromPieceStart(ring)));
}

/**
 * The ring begun at its sharpest corner, or where it has none at the start of its longest edge, so that no arc is
 * divided where the ring happens to start.
 */
export function fromPieceStart(ring: Ring): Ring {
  const at = (i: number) => ring[(i + ring.length) % ring.length]!;
  const sharpest = largest(ring, (i) => turnAt(at(i - 1), at(i), at(i + 1)));
  const start = sharpest.value >= LEAST_CORNER ? sharpest : largest(ring, (i) => distance(at(i), at(i + 1)));
  return start.index === 0 ? ring : [...ring.slice(start.index), ...ring.slice(0, start.index)];
}

/** The first of those points whose figure is largest, but for rounding. */
function largest(ring: Ring, figure: (i: number) => number): { index: number; value: number } {
  let best = { index: 0, value: -Infinity };
  ring.forEach((_, index) => {
    const value = figure(index);
    if (value > best.value + 1e-6) best = { index, value };
  });
  return best;
}

function turnAt(before: Vec, at: Vec, after: Vec): number {
  const a = subtract(at, before);
  const b = subtract(after, at);
  return Math.abs(Math.atan2(cross(a, b), dot(a, b)));
}

function piecesOfSegment(from: Vec, segment: Segment): readonly TrackPiece[] {
  switch (segment.kind) {
    case 'line':
      return [linePiece(from, segment.to)];
    case 'arc':
      return [arcBetween(from, segment.to, segment.center, segment.ccw)];
    case 'cubic': {
      const { points } = flattenContour({ start: from, segments: [segment], closed: false }, RING_SIMPLIFY);
      if (points.length < 2) return [];
      const fitted = fitArcs(points, { closed: false, tolerance: CURVE_FIT });
      return trackOfPathPieces(from, fitted, false).pieces;
    }
  }
}
