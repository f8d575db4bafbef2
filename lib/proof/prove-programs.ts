import { checkCancelled, type WorkControl } from '@/lib/base/cancel';
import type { Job } from '@/lib/job/job-schema';
import type { ResolvedOutlines } from '@/lib/outline/resolve-outlines';
import type { ProgramIntent, TabPlace } from '@/lib/report/intent';
import type { CutReport, Finding, ProgramReport } from '@/lib/report/report';
import { zeroOf } from '@/lib/job/cut-values';
import { createBoardModel, type BoardModel } from './board-model';
import { CHECKS } from './checks/all-checks';
import { estimateSeconds } from './estimate-time';
import { motionLength } from './motion';
import type { MeasuredTab } from './proof-context';
import { readIntent, type ReadIntent } from './read-intent';
import { sweepPrograms } from './sweep-programs';
import { measureTabWood } from './tab-wood';

export type ProgramFigures = Pick<ProgramReport, 'file' | 'seconds' | 'lines' | 'bounds'>;

/** What the programs' text was found to do. */
export interface Proof {
  readonly findings: readonly Finding[];
  readonly programs: readonly ProgramFigures[];
  readonly cuts: readonly CutReport[];
  readonly board: BoardModel;
}

/** A tab holds when it has the wood asked for, less what rounding and sampling may take, mm. */
export const HOLD_SLACK = 0.02;

/**
 * Reads every program's text back, sweeps it through a model of the board, face after face, and looks for what is
 * wrong. `job` is a resolved one. Throws the reader's ProgramError where a text is no program.
 */
export function proveJob(
  job: Job,
  outlines: ResolvedOutlines,
  programs: readonly ProgramIntent[],
  tabs: readonly TabPlace[],
  control?: WorkControl,
): Proof {
  const read = programs.map((program) => {
    checkCancelled(control);
    return readIntent(job, program);
  });
  return proveRead(job, outlines, read, tabs, control);
}

/** The proof of programs that were read already. */
export function proveRead(
  job: Job,
  outlines: ResolvedOutlines,
  programs: readonly ReadIntent[],
  places: readonly TabPlace[],
  control?: WorkControl,
): Proof {
  const board = createBoardModel(job);
  const { removed, bites } = sweepPrograms(job, board, programs, control);
  const tabs = places.map((place): MeasuredTab => {
    checkCancelled(control);
    return { place, wood: measureTabWood(job, programs, place) };
  });
  const seconds = programs.map(({ steps }) => estimateSeconds(steps, job.machine));
  const cuts = cutReports(job, programs, seconds, removed, tabs);
  control?.onProgress?.(1, 'Looking for what is wrong');
  const context = { job, outlines, programs, cuts, tabs, board, bites };
  const findings = CHECKS.flatMap((check) => {
    checkCancelled(control);
    return check(context);
  });
  return { findings, programs: programs.map((p, i) => figuresOf(p, seconds[i]!)), cuts, board };
}

function figuresOf({ intent, lines, bounds }: ReadIntent, seconds: readonly number[]): ProgramFigures {
  return {
    file: intent.file,
    seconds: seconds.reduce((sum, value) => sum + value, 0),
    lines,
    bounds: bounds ?? { min: [0, 0, 0], max: [0, 0, 0] },
  };
}

function cutReports(
  job: Job,
  programs: readonly ReadIntent[],
  seconds: readonly (readonly number[])[],
  removed: ReadonlyMap<string, number>,
  tabs: readonly MeasuredTab[],
): CutReport[] {
  const sums = new Map<
    string,
    { seconds: number; cutLength: number; travelLength: number; minZ: number | null }
  >();
  programs.forEach(({ intent, steps }, n) => {
    const zero = zeroOf(job, intent.face).z;
    steps.forEach((step, i) => {
      if (step.cut === null) return;
      const sum = sums.get(step.cut) ?? { seconds: 0, cutLength: 0, travelLength: 0, minZ: null };
      sums.set(step.cut, sum);
      sum.seconds += seconds[n]![i]!;
      if (step.kind !== 'motion') return;
      if (step.rapid) sum.travelLength += motionLength(step);
      else sum.cutLength += motionLength(step);
      const low = Math.min(step.from.z, step.to.z) - zero;
      sum.minZ = sum.minZ === null ? low : Math.min(sum.minZ, low);
    });
  });
  return [...sums].map(([id, sum]) => ({
    id,
    ...sum,
    removed: removed.get(id) ?? 0,
    tabs: tabs.filter(({ place }) => place.cut === id).map(tabReport),
  }));
}

function tabReport({ place, wood }: MeasuredTab): CutReport['tabs'][number] {
  const { outline, contour, fraction, at, length, height, hold } = place;
  return { outline, contour, fraction, at, length, height, wood, holds: wood.height >= hold - HOLD_SLACK };
}
