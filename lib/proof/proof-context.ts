import type { Cut } from '@/lib/job/cut-schema';
import type { Job } from '@/lib/job/job-schema';
import type { ResolvedOutlines } from '@/lib/outline/resolve-outlines';
import type { TabPlace } from '@/lib/report/intent';
import type { CutReport, FaceName, Finding } from '@/lib/report/report';
import type { BoardModel } from './board-model';
import type { ReadIntent } from './read-intent';
import type { RapidBite } from './sweep-programs';
import type { TabWood } from './tab-wood';

/** A tab with the wood that was found in it. */
export interface MeasuredTab {
  readonly place: TabPlace;
  readonly wood: TabWood;
}

/** All that a check may look at. */
export interface ProofContext {
  /** With every default filled in. */
  readonly job: Job;
  readonly outlines: ResolvedOutlines;
  readonly programs: readonly ReadIntent[];
  readonly cuts: readonly CutReport[];
  readonly tabs: readonly MeasuredTab[];
  readonly board: BoardModel;
  readonly bites: readonly RapidBite[];
}

/** One thing that is looked for; each in a file of its own. */
export type Check = (context: ProofContext) => Finding[];

/** What people call a cut. */
export function cutTitle(cut: Pick<Cut, 'id' | 'name'>): string {
  return `'${cut.name || cut.id}'`;
}

/** The cut with this id; null for lines that work for no cut that the job knows. */
export function cutById(job: Job, id: string | null): Cut | null {
  return job.cuts.find((cut) => cut.id === id) ?? null;
}

/** Faces as people say them. */
export function faceTitle(face: FaceName): string {
  return `face ${face}`;
}

/** A length for a sentence: two decimals at most, no trailing zeros. */
export function mm(length: number): string {
  return `${Number(length.toFixed(2))} mm`;
}
