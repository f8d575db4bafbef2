import type { CutterShape } from './cutter-shape';
import type { MotionPoint } from './motion';

/** A straight motion that moves in plan, as the sweep needs it. */
export interface Segment {
  readonly x: number;
  readonly y: number;
  readonly z: number;
  /** Unit direction in plan. */
  readonly dx: number;
  readonly dy: number;
  /** Length in plan, mm. */
  readonly length: number;
  /** Rise of z per mm in plan. */
  readonly slope: number;
  /**
   * Greatest distance along the motion between a cell and where the cutter stands when its edge is lowest over it: 0 on
   * level motions, up to the radius on sloping ones.
   */
  readonly shift: number;
}

/** Shorter motions than this in plan go straight up or down, mm. */
const UPRIGHT = 1e-9;

/** The segment between two points, or null where it only goes up or down. */
export function planSegment(from: MotionPoint, to: MotionPoint, shape: CutterShape): Segment | null {
  const dx = to.x - from.x;
  const dy = to.y - from.y;
  const length = Math.sqrt(dx * dx + dy * dy);
  if (length < UPRIGHT) return null;
  const rise = to.z - from.z;
  const slope = Math.abs(rise) < 1e-9 ? 0 : rise / length;
  return {
    x: from.x,
    y: from.y,
    z: from.z,
    dx: dx / length,
    dy: dy / length,
    length,
    slope,
    shift: greatestShift(shape, slope),
  };
}

/**
 * Where d/dt of (height along the motion + edge's rise) vanishes: a ball's at s·√((R² − h²)/(1 + s²)), a cone's at
 * s·|h|/√(k² − s²) (k its rise per mm) but not within its flat tip; beyond the edge of the cutter for steeper motions.
 */
function greatestShift({ kind, radius, tip, steepness }: CutterShape, slope: number): number {
  const s = Math.abs(slope);
  if (s === 0) return 0;
  if (kind === 'flat') return radius;
  if (kind === 'ball') return (s * radius) / Math.sqrt(1 + s * s);
  if (s >= steepness) return radius;
  return Math.min(radius, Math.max(tip, (s * radius) / Math.sqrt(steepness * steepness - s * s)));
}
