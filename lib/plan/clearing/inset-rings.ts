import { checkCancelled, type WorkControl } from '@/lib/base/cancel';
import { RING_SIMPLIFY } from '@/lib/base/tolerances';
import { differenceRegions } from '@/lib/geometry/boolean';
import type { Region, Ring } from '@/lib/geometry/contour';
import { regionContains } from '@/lib/geometry/measure';
import { offsetRegion } from '@/lib/geometry/offset';
import { regionPieces } from '@/lib/geometry/pieces';
import { insetRegion } from '../shared/inset-region';
import { simplifyRing } from '@/lib/geometry/simplify';

/** Discs are taken this much smaller when looking for spots that passes missed, mm. */
const COVER_SLACK = 0.01;

/** Missed spots smaller than this are no wood, mm². */
const LEAST_SPOT = 1e-4;

/** A piece of ground at one distance from the walls, with what lies deeper inside it. */
export interface InsetPiece {
  /** Boundary of the piece: passes of the cutter's axis. */
  readonly region: Region;
  readonly inner: readonly InsetPiece[];
  /** Rings over spots between this pass and the next that neither of them clears. */
  readonly spots: readonly Ring[];
}

/**
 * Passes that clear `ground` (where the axis may be) with a disc of `radius`: its boundary, and insets of it by
 * `stepover` until nothing is left. Where a pass leaves spots that the next one does not clear, as wide step-overs do in
 * corners and middles, rings over them are added.
 */
export function insetPieces(
  ground: Region,
  stepover: number,
  radius: number,
  control?: WorkControl,
): InsetPiece[] {
  return regionPieces(ground).map((piece) => insetPiece(piece, stepover, radius, control));
}

function insetPiece(region: Region, stepover: number, radius: number, control?: WorkControl): InsetPiece {
  checkCancelled(control);
  const next = thinned(insetRegion(region, stepover));
  return {
    region,
    inner: regionPieces(next).map((piece) => insetPiece(piece, stepover, radius, control)),
    spots: missedSpots(region, next, stepover, radius),
  };
}

/** What lies further than the radius inside this pass and further than the radius outside the next. */
function missedSpots(region: Region, next: Region, stepover: number, radius: number): Ring[] {
  const reach = radius - COVER_SLACK;
  // A step below the radius leaves nothing: what this pass does not reach lies inside the next one.
  if (stepover <= reach) return [];
  const beyond = insetRegion(region, reach);
  if (beyond.length === 0) return [];
  const missed = next.length > 0 ? differenceRegions(beyond, offsetRegion(next, reach)) : beyond;
  return regionPieces(missed)
    .map(([outer]) => outer ?? [])
    .filter((ring) => Math.abs(area(ring)) > LEAST_SPOT);
}

function thinned(region: Region): Region {
  return region.map((ring) => simplifyRing(ring, RING_SIMPLIFY)).filter((ring) => ring.length > 2);
}

function area(ring: Ring): number {
  return ring.reduce((sum, p, i) => {
    const q = ring[(i + 1) % ring.length]!;
    return sum + (p.x * q.y - q.x * p.y) / 2;
  }, 0);
}

/** The deepest piece of a tree of passes: the last of its chain of widest insets. */
export function deepestPiece(piece: InsetPiece): InsetPiece {
  return piece.inner.length === 0 ? piece : deepestPiece(deepestOf(piece.inner));
}

function deepestOf(pieces: readonly InsetPiece[]): InsetPiece {
  return pieces.reduce((best, piece) => (levels(piece) > levels(best) ? piece : best));
}

function levels(piece: InsetPiece): number {
  return 1 + piece.inner.reduce((most, inner) => Math.max(most, levels(inner)), 0);
}

/** A place inside the region, if one of the usual candidates is: the middle of its box, of its points, a vertex. */
export function somewhereIn(region: Region): { x: number; y: number } {
  const ring = region[0]!;
  const middle = {
    x: ring.reduce((sum, { x }) => sum + x, 0) / ring.length,
    y: ring.reduce((sum, { y }) => sum + y, 0) / ring.length,
  };
  return regionContains(region, middle) ? middle : ring[0]!;
}
