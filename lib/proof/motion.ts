import type { MotionEvent } from '@/lib/gcode/read/program-event';

/** A point of a motion, mm; what the coordinates are against is said where motions are made. */
export interface MotionPoint {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

/** An arc in plan about a centre, helical where the ends' z differ. */
export interface MotionArc {
  readonly x: number;
  readonly y: number;
  /** Signed radians, positive counter-clockwise, whole turns in. */
  readonly sweep: number;
}

/** One straight or circular motion of the cutter's lowest point, with where it came from in the text. */
export interface Motion {
  readonly rapid: boolean;
  readonly from: MotionPoint;
  readonly to: MotionPoint;
  readonly arc: MotionArc | null;
  /** mm/min along the path; 0 for rapids. */
  readonly feed: number;
  readonly line: number;
}

/** A motion event as a motion in program coordinates, or null where it is not known from where the machine comes. */
export function motionOf(event: MotionEvent): Motion | null {
  const { from, to, line } = event;
  if (!from) return null;
  const arc = event.kind === 'arc' ? { ...event.center, sweep: event.sweep } : null;
  return {
    rapid: event.kind === 'rapid',
    from,
    to,
    arc,
    feed: event.kind === 'rapid' ? 0 : event.feed,
    line,
  };
}

/** The motion with its points carried over by `place`; `mirrored` says that this turns arcs round. */
export function placeMotion(
  motion: Motion,
  place: (p: MotionPoint) => MotionPoint,
  mirrored: boolean,
): Motion {
  const { arc } = motion;
  const center = arc ? place({ x: arc.x, y: arc.y, z: 0 }) : null;
  return {
    ...motion,
    from: place(motion.from),
    to: place(motion.to),
    arc: arc && center ? { x: center.x, y: center.y, sweep: mirrored ? -arc.sweep : arc.sweep } : null,
  };
}

/** Length of a motion in plan, mm. */
export function planLength({ from, to, arc }: Motion): number {
  return arc
    ? Math.abs(arc.sweep) * Math.hypot(from.x - arc.x, from.y - arc.y)
    : Math.hypot(to.x - from.x, to.y - from.y);
}

/** Length of a motion in space, mm. */
export function motionLength(motion: Motion): number {
  return Math.hypot(planLength(motion), motion.to.z - motion.from.z);
}

/**
 * The motion as points after its start, chords of an arc within `tolerance` of it. A line gives its end; z changes
 * evenly along an arc.
 */
export function motionStops(motion: Motion, tolerance: number): MotionPoint[] {
  const { from, to, arc } = motion;
  if (!arc) return [to];
  const radius = Math.hypot(from.x - arc.x, from.y - arc.y);
  const most = radius > tolerance ? 2 * Math.acos(1 - tolerance / radius) : Math.PI / 2;
  const count = Math.max(1, Math.ceil(Math.abs(arc.sweep) / Math.min(most, Math.PI / 2)));
  const start = Math.atan2(from.y - arc.y, from.x - arc.x);
  return Array.from({ length: count }, (_, i) => {
    if (i === count - 1) return to;
    const share = (i + 1) / count;
    const angle = start + arc.sweep * share;
    return {
      x: arc.x + radius * Math.cos(angle),
      y: arc.y + radius * Math.sin(angle),
      z: from.z + (to.z - from.z) * share,
    };
  });
}
