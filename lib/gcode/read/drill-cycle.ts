import type { MotionEvent, ProgramPoint } from './program-event';

export interface DrillCycle {
  readonly from: ProgramPoint;
  readonly x: number;
  readonly y: number;
  /** Bottom and retract level, mm. */
  readonly z: number;
  readonly r: number;
  /** Depth of a peck (G83), 0 for one go (G81). */
  readonly peck: number;
  readonly returnsToInitial: boolean;
  readonly feed: number;
  readonly line: number;
}

/** A rapid back down stops this far above where the last peck ended, mm (NIST RS274NGC 3.5.16.3 says 0.01 inch). */
const PECK_CLEARANCE = 0.254;

/** The moves of G81 and G83 written out (NIST RS274NGC 3.5.16): to R, across, down, back. */
export function drillCycle({
  from,
  x,
  y,
  z,
  r,
  peck,
  returnsToInitial,
  feed,
  line,
}: DrillCycle): MotionEvent[] {
  const events: MotionEvent[] = [];
  let at = from;
  const rapid = (to: ProgramPoint): void => {
    if (to.x === at.x && to.y === at.y && to.z === at.z) return;
    events.push({ kind: 'rapid', from: at, to, line });
    at = to;
  };
  const down = (to: number): void => {
    events.push({ kind: 'feed', from: at, to: { x, y, z: to }, feed, line });
    at = { x, y, z: to };
  };
  const top = Math.max(from.z, r);
  rapid({ ...from, z: top });
  rapid({ x, y, z: top });
  rapid({ x, y, z: r });
  if (peck > 0) {
    for (let bottom = r - peck; bottom > z; bottom -= peck) {
      down(bottom);
      rapid({ x, y, z: r });
      rapid({ x, y, z: Math.min(r, bottom + PECK_CLEARANCE) });
    }
  }
  down(z);
  rapid({ x, y, z: returnsToInitial ? top : r });
  return events;
}
