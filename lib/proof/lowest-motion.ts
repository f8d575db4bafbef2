import type { MotionPoint } from './motion';
import type { ReadIntent, WorkMotion } from './read-intent';

/** Where a cut's cutter goes lowest in one program. */
export interface LowestPlace {
  readonly program: ReadIntent;
  readonly motion: WorkMotion;
  /** In the face's view, z against the nominal face. */
  readonly point: MotionPoint;
}

/** The lowest place of each cut and cutter in each program, in order of the text; lines of no cut count as one. */
export function lowestPlaces(programs: readonly ReadIntent[]): LowestPlace[] {
  return programs.flatMap((program) => {
    const lowest = new Map<string, LowestPlace>();
    for (const motion of program.steps) {
      if (motion.kind !== 'motion') continue;
      const point = motion.to.z <= motion.from.z ? motion.to : motion.from;
      const key = JSON.stringify([motion.cut, motion.cutter]);
      const before = lowest.get(key);
      if (!before || point.z < before.point.z) lowest.set(key, { program, motion, point });
    }
    return [...lowest.values()];
  });
}
