import { RING_SIMPLIFY } from '@/lib/base/tolerances';
import type { Contour, Region, Ring, Segment } from '@/lib/geometry/contour';
import { fitArcs } from '@/lib/geometry/fit-arcs';
import { flattenContour } from '@/lib/geometry/flatten';
import { cross, dot, subtract, type Vec } from '@/lib/geometry/vec';
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

/** The tracks round a region's rings, each in the ring's direction and begun at its sharpest corner. */
export function tracksOfRegion(region: Region): Track[] {
  return region.filter((ring) => ring.length > 2).map((ring) => trackOfRing(fromSharpestCorner(ring)));
}

/** The ring begun at its sharpest corner, so that no arc is divided where the ring happens to start. */
export function fromSharpestCorner(ring: Ring): Ring {
  let best = 0;
  let sharpest = -1;
  ring.forEach((point, i) => {
    const turn = turnAt(ring[(i + ring.length - 1) % ring.length]!, point, ring[(i + 1) % ring.length]!);
    if (turn > sharpest + 1e-6) {
      sharpest = turn;
      best = i;
    }
  });
  return best === 0 ? ring : [...ring.slice(best), ...ring.slice(0, best)];
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
