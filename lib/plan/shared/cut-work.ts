import type { WorkControl } from '@/lib/base/cancel';
import type { Ring } from '@/lib/geometry/contour';
import type { Vec } from '@/lib/geometry/vec';
import type { Cut, CutKind, CutOf } from '@/lib/job/cut-schema';
import { cutSpeeds, cutterOf, zeroOf } from '@/lib/job/cut-values';
import type { Job } from '@/lib/job/job-schema';
import type { Cutter } from '@/lib/job/machine-schema';
import type { Move } from '@/lib/moves/move';
import type { ResolvedOutline, ResolvedOutlines } from '@/lib/outline/resolve-outlines';
import type { FindingCode } from '@/lib/report/finding-codes';
import type { TabPlace } from '@/lib/report/intent';
import { makeFinding } from '@/lib/report/make-finding';
import type { Finding } from '@/lib/report/report';
import type { MoveLimits } from './move-writer';

/** How deep the far face's cuts go under a ring in this face's view, mm from the far face; 0 where none does. */
export type FarDepth = (footprint: Ring) => number;

/** What planning any cut needs. Coordinates are in the view of the cut's face. */
export interface AnyCutWork {
  readonly job: Job;
  readonly cut: Cut;
  readonly cutter: Cutter;
  /** The cut's outlines in its face's view, in its order. */
  readonly outlines: readonly ResolvedOutline[];
  /** Every outline of the job, for cuts that look at another cut. */
  readonly resolved: ResolvedOutlines;
  readonly limits: MoveLimits;
  /** Thickest layer, mm. */
  readonly stepdown: number;
  /** Null while only the wood that a cut may take is wanted: tabs are then left out. */
  readonly farDepth: FarDepth | null;
  readonly control: WorkControl | undefined;
}

/** Everything that a planner of one kind of cut is given. */
export interface CutWork<Kind extends CutKind> extends AnyCutWork {
  readonly cut: CutOf<Kind>;
}

export interface CutStep {
  readonly cutter: string;
  readonly moves: readonly Move[];
}

/** What a planner gives: steps in order, none where the cut's result is empty. */
export interface CutPlan {
  readonly steps: readonly CutStep[];
  readonly tabs: readonly TabPlace[];
  readonly findings: readonly Finding[];
}

export type CutPlanner<Kind extends CutKind> = (work: CutWork<Kind>) => CutPlan;

/** A plan of one step with the cut's own cutter, or of none where it has no moves. */
export function planOf(
  work: AnyCutWork,
  moves: readonly Move[],
  findings: readonly Finding[] = [],
  tabs: readonly TabPlace[] = [],
): CutPlan {
  const steps = moves.length > 0 ? [{ cutter: work.cutter.id, moves }] : [];
  return { steps, tabs, findings };
}

/** Heights and feeds of a cut within what the machine can do. */
export function moveLimits(job: Job, feed: number, plunge: number): MoveLimits {
  const { clearance, approach, feedMax } = job.machine;
  return { clearance, approach, feed: Math.min(feed, feedMax.xy), plunge: Math.min(plunge, feedMax.z) };
}

/** The work of one cut with its own cutter and speeds. */
export function cutWork(
  job: Job,
  cut: Cut,
  resolved: ResolvedOutlines,
  farDepth: FarDepth | null,
  control: WorkControl | undefined,
): AnyCutWork {
  const { feed, plunge, stepdown } = cutSpeeds(job, cut);
  return {
    job,
    cut,
    cutter: cutterOf(job, cut),
    outlines: cut.outlines.map((id) => resolved.get(id, cut.face)),
    resolved,
    limits: moveLimits(job, feed, plunge),
    stepdown,
    farDepth,
    control,
  };
}

/** What people call a cut. */
export function cutName({ cut }: { readonly cut: { readonly name: string; readonly id: string } }): string {
  return `'${cut.name || cut.id}'`;
}

/** A length for a sentence: mm, at most two decimals. */
export function figure(length: number): string {
  return String(Math.round(length * 100) / 100);
}

/** A finding about this cut at a place of its face. */
export function cutFinding(work: AnyCutWork, code: FindingCode, message: string, at?: Vec): Finding {
  const { id, face } = work.cut;
  return makeFinding(code, message, { cut: id, face, ...(at && { at: [at.x, at.y] as const }) });
}

/** Where the cutter is taken to come from at the start of a cut: over the program's zero. */
export function startPlace(work: AnyCutWork): Vec {
  const { x, y } = zeroOf(work.job, work.cut.face);
  return { x, y };
}
