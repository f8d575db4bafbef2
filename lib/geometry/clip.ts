import ClipperLib from 'clipper-lib';
import { CLIPPER_SCALE } from '@/lib/base/tolerances';
import type { Region, Ring } from './contour';

/**
 * The one seam to clipper-lib, which works on integers. Rings go in and come out in mm; coordinates are rounded to
 * 1 / {@link CLIPPER_SCALE} mm. Nothing else in the project knows the library.
 */
export type FillRule = 'nonzero' | 'evenodd' | 'positive';
export type ClipOperation = 'union' | 'intersection' | 'difference' | 'xor';

const FILL: Readonly<Record<FillRule, number>> = {
  evenodd: ClipperLib.PolyFillType.pftEvenOdd,
  nonzero: ClipperLib.PolyFillType.pftNonZero,
  positive: ClipperLib.PolyFillType.pftPositive,
};
const OPERATION: Readonly<Record<ClipOperation, number>> = {
  intersection: ClipperLib.ClipType.ctIntersection,
  union: ClipperLib.ClipType.ctUnion,
  difference: ClipperLib.ClipType.ctDifference,
  xor: ClipperLib.ClipType.ctXor,
};

/**
 * Combines rings, each side filled by its rule. The result's outer rings run counter-clockwise, its holes clockwise,
 * none crosses itself or another; rings without area are dropped. Throws RangeError on coordinates that are not finite
 * or beyond what the integers carry.
 */
export function clip(
  operation: ClipOperation,
  subject: readonly Ring[],
  other: readonly Ring[],
  rule: FillRule,
  otherRule: FillRule = rule,
): Region {
  const clipper = new ClipperLib.Clipper();
  clipper.StrictlySimple = true;
  addRings(clipper, subject, ClipperLib.PolyType.ptSubject);
  addRings(clipper, other, ClipperLib.PolyType.ptClip);
  const solution: ClipperLib.IntPoint[][] = [];
  clipper.Execute(OPERATION[operation], solution, FILL[rule], FILL[otherRule]);
  return solution.filter((path) => path.length > 2).map(toRing);
}

function addRings(clipper: ClipperLib.Clipper, rings: readonly Ring[], type: number): void {
  for (const ring of rings) if (ring.length > 2) clipper.AddPath(ring.map(toInteger), type, true);
}

function toInteger({ x, y }: { x: number; y: number }): ClipperLib.IntPoint {
  const X = Math.round(x * CLIPPER_SCALE);
  const Y = Math.round(y * CLIPPER_SCALE);
  if (!(Math.abs(X) <= LARGEST) || !(Math.abs(Y) <= LARGEST))
    throw new RangeError(`Cannot clip at (${x}, ${y})`);
  return { X, Y };
}

/** clipper-lib's own limit for exact products. */
const LARGEST = 4.5e15;

function toRing(path: readonly ClipperLib.IntPoint[]): Ring {
  return path.map(({ X, Y }) => ({ x: X / CLIPPER_SCALE, y: Y / CLIPPER_SCALE }));
}
