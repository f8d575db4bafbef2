import { checkCancelled, type WorkControl } from '@/lib/base/cancel';
import { differenceRegions, unionRegions } from '@/lib/geometry/boolean';
import type { Box, Polyline, Region, Ring } from '@/lib/geometry/contour';
import { createDistanceQuery } from '@/lib/geometry/distance-query';
import { regionBox, regionContains } from '@/lib/geometry/measure';
import { strokePolyline } from '@/lib/geometry/offset';
import { regionPieces } from '@/lib/geometry/pieces';
import { distance, lerp, type Vec } from '@/lib/geometry/vec';
import { insetRegion } from '../shared/inset-region';
import { trackOfPoints, type Track } from '../shared/track';
import { withoutSlivers } from './open-region';

/** Distance of the places at which a pass is tested, mm. */
const TEST_STEP = 0.1;

/** Discs are taken this much smaller when what is left is worked out, mm. */
const COVER_SLACK = 0.01;

/**
 * Passes over leavings, piece by piece, each piece from its innermost pass to the wall: the stretches of `ground`'s
 * boundary and its insets on which a disc of `radius` touches what is still left there, and no more. Spots that remain
 * in the middle get rounds of their own where the axis is `allowed`.
 */
export function restPasses(
  ground: Region,
  leavings: Region,
  radius: number,
  stepover: number,
  control?: WorkControl,
  allowed: Region = ground,
): Track[][] {
  return regionPieces(leavings).map((piece) => {
    const passes: Track[] = [];
    let left: Region = piece;
    let level = ground;
    while (left.length > 0 && level.length > 0) {
      checkCancelled(control);
      const runs = touchingRuns(level, left, radius);
      passes.unshift(...runs.map(({ points, closed }) => trackOfPoints(points, closed)));
      if (runs.length > 0) {
        const swept = unionRegions(runs.map((run) => strokePolyline(run, radius - COVER_SLACK)));
        left = withoutSlivers(differenceRegions(left, swept));
      }
      level = insetRegion(level, stepover);
    }
    return [...spotRounds(left, allowed), ...passes];
  });
}

/** Rounds about spots that lie deeper in than the last pass and wider apart than it reaches. */
function spotRounds(left: Region, allowed: Region): Track[] {
  return regionPieces(left)
    .map(([outer]) => outer ?? [])
    .filter((ring) => ring.length > 2 && ring.every((p) => regionContains(allowed, p)))
    .map((ring) => trackOfPoints(ring, true));
}

/** The stretches of a region's rings from which the disc touches what is left. */
function touchingRuns(level: Region, left: Region, radius: number): Polyline[] {
  const box = regionBox(left);
  const near: Box = {
    minX: box.minX - radius,
    minY: box.minY - radius,
    maxX: box.maxX + radius,
    maxY: box.maxY + radius,
  };
  const edge = createDistanceQuery(left);
  const touches = (p: Vec) => boxMeets(near, p, p) && (edge.distance(p) < radius || regionContains(left, p));
  return level.flatMap((ring) => runsOf(withStops(ring, near), touches));
}

/** A ring's points with more of them between, where it comes near the box. */
function withStops(ring: Ring, near: Box): Vec[] {
  return ring.flatMap((a, i) => {
    const b = ring[(i + 1) % ring.length]!;
    const count = boxMeets(near, a, b) ? Math.max(1, Math.ceil(distance(a, b) / TEST_STEP)) : 1;
    return Array.from({ length: count }, (_, k) => lerp(a, b, k / count));
  });
}

/** Whether the box about two points meets a box. */
function boxMeets(box: Box, a: Vec, b: Vec): boolean {
  return (
    Math.max(a.x, b.x) >= box.minX &&
    Math.min(a.x, b.x) <= box.maxX &&
    Math.max(a.y, b.y) >= box.minY &&
    Math.min(a.y, b.y) <= box.maxY
  );
}

/** Stretches of consecutive points that pass, each with one more point at either end; all of them are a closed run. */
function runsOf(points: readonly Vec[], passes: (p: Vec) => boolean): Polyline[] {
  const flags = points.map(passes);
  const first = flags.indexOf(false);
  if (first < 0) return [{ points, closed: true }];
  const runs: Polyline[] = [];
  let run: Vec[] = [];
  for (let i = 1; i <= points.length; i++) {
    const at = (first + i) % points.length;
    if (flags[at]) {
      if (run.length === 0) run.push(points[(at + points.length - 1) % points.length]!);
      run.push(points[at]!);
    } else if (run.length > 0) {
      runs.push({ points: [...run, points[at]!], closed: false });
      run = [];
    }
  }
  return runs;
}
