import type { Cut } from './cut-schema';
import type { Job } from './job-schema';
import type { Cutter } from './machine-schema';
import type { Face } from './numbers';

/** The cutter of a cut. Throws where the document was not checked. */
export function cutterOf(job: Job, cut: Pick<Cut, 'cutter'>): Cutter {
  return cutterById(job, cut.cutter);
}

/** The cutter with this id. Throws where the document was not checked. */
export function cutterById(job: Job, id: string): Cutter {
  const cutter = job.cutters.find((candidate) => candidate.id === id);
  if (!cutter) throw new Error(`No cutter '${id}'`);
  return cutter;
}

export interface CutSpeeds {
  /** mm/min along the path. */
  readonly feed: number;
  /** mm/min straight down. */
  readonly plunge: number;
  readonly rpm: number;
  /** Thickest layer, mm. */
  readonly stepdown: number;
}

/** The cut's own speeds where it has them, else the cutter's; before any limit of the machine. */
export function cutSpeeds(job: Job, cut: Cut): CutSpeeds {
  const { speeds } = cutterOf(job, cut);
  return {
    feed: cut.feed ?? speeds.feed,
    plunge: cut.plunge ?? speeds.plunge,
    rpm: cut.rpm ?? speeds.rpm,
    stepdown: cut.stepdown ?? speeds.stepdown,
  };
}

/** Whether a cut is asked to go through the board. */
export function isThrough(cut: Cut): boolean {
  return 'depth' in cut && cut.depth === 'through';
}

/** Length of a cutter's point, mm: what a through hole needs beyond the far face. 0 for flat and ball cutters. */
export function pointLength(cutter: Cutter): number {
  if (cutter.kind !== 'drill') return 0;
  return cutter.diameter / 2 / Math.tan(((cutter.angle / 2) * Math.PI) / 180);
}

/**
 * How far the floor lies below the face being cut, mm (positive down): start + depth, or the board's thickness less a
 * skin plus `below` for a through cut. Of a resolved job. A drilled through hole adds the length of the drill's point.
 */
export function cutFloor(job: Job, cut: Cut): number {
  if (cut.kind === 'chamfer') throw new Error('A chamfer has a width, not a floor');
  if (cut.depth !== 'through') return cut.start + cut.depth;
  const skin = cut.kind === 'profile' ? cut.skin : 0;
  const below = 'below' in cut ? (cut.below ?? 0) : 0;
  const point = cut.kind === 'drill' ? pointLength(cutterOf(job, cut)) : 0;
  return job.board.z - skin + below + point;
}

/** Where a program's X0 Y0 Z0 stands in the face's view (z: 0 on the nominal face); program = view − zero. */
export function zeroOf(job: Job, face: Face): { x: number; y: number; z: number } {
  const setup = job.setups[face];
  if (!setup) throw new Error(`No set-up for face ${face}`);
  const { corner, z } = setup.zero;
  const { board } = job;
  const height = z === 'bed' ? -board.z : 0;
  if (corner === 'center') return { x: board.x / 2, y: board.y / 2, z: height };
  return {
    x: corner.endsWith('right') ? board.x : 0,
    y: corner.startsWith('back') ? board.y : 0,
    z: height,
  };
}
