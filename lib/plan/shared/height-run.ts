import { SAME_POINT } from '@/lib/base/tolerances';
import { DEGREES } from '@/lib/geometry/vec';
import type { MoveWriter } from './move-writer';
import { pointAt, sliceTrack, type Track } from './track';

/** A stretch of a track between two lengths on which z changes evenly. Lengths beyond the track's mean later laps. */
export interface HeightRun {
  readonly from: number;
  readonly to: number;
  readonly zFrom: number;
  readonly zTo: number;
}

/** Where a track is held up over a tab: z stays at or above `top` within `half` of `at`, then falls by `slope`. */
export interface TabLift {
  readonly at: number;
  readonly half: number;
  /** z of the tab's top against the nominal face. */
  readonly top: number;
  /** Degrees; 90 is a step. */
  readonly slope: number;
}

/** Moves along runs that follow one another; where z jumps between two of them the cutter goes straight up or down. */
export function followRuns(writer: MoveWriter, track: Track, runs: readonly HeightRun[]): void {
  for (const run of runs) {
    writer.feedTo(pointAt(track, run.from), run.zFrom);
    writer.follow(sliceTrack(track, run.from, run.to), run.zTo);
  }
}

/** The run with every tab's lift taken into account. `lap`: the track's length where it is closed, else Infinity. */
export function liftOverTabs(run: HeightRun, tabs: readonly TabLift[], lap: number): HeightRun[] {
  const lifts = tabs.flatMap((tab) => lapsOf(tab, run, lap));
  return lifts.reduce<HeightRun[]>((runs, tab) => runs.flatMap((part) => liftOver(part, tab)), [run]);
}

/** How far from its middle a tab holds the track above `z`. */
export function liftReach(tab: TabLift, z: number): number {
  if (z >= tab.top) return 0;
  return tab.half + (tab.slope >= 90 ? 0 : (tab.top - z) / Math.tan(tab.slope * DEGREES));
}

function lapsOf(tab: TabLift, run: HeightRun, lap: number): TabLift[] {
  const reach = liftReach(tab, Math.min(run.zFrom, run.zTo));
  if (reach === 0) return [];
  if (!Number.isFinite(lap)) return [tab];
  const out: TabLift[] = [];
  const first = Math.ceil((run.from - reach - tab.at) / lap);
  for (let n = first; tab.at + n * lap - reach < run.to; n++) out.push({ ...tab, at: tab.at + n * lap });
  return out;
}

function liftOver(run: HeightRun, tab: TabLift): HeightRun[] {
  const reach = liftReach(tab, Math.min(run.zFrom, run.zTo));
  const stops = [tab.at - reach, tab.at - tab.half, tab.at + tab.half, tab.at + reach]
    .filter((stop) => stop > run.from + SAME_POINT && stop < run.to - SAME_POINT)
    .sort((a, b) => a - b);
  const edges = [run.from, ...stops, run.to];
  return edges.slice(1).flatMap((to, i) => {
    const from = edges[i]!;
    return to - from > SAME_POINT ? higherOf(part(run, from, to), tab) : [];
  });
}

function part(run: HeightRun, from: number, to: number): HeightRun {
  const z = (at: number) => run.zFrom + ((run.zTo - run.zFrom) * (at - run.from)) / (run.to - run.from);
  return { from, to, zFrom: z(from), zTo: z(to) };
}

/** The higher of a run and the tab's own line on a stretch on which both are straight. */
function higherOf(run: HeightRun, tab: TabLift): HeightRun[] {
  const line = tabLine(run, tab);
  if (!line) return [run];
  const before = line.zFrom - run.zFrom;
  const after = line.zTo - run.zTo;
  if (before <= 0 && after <= 0) return [run];
  if (before >= 0 && after >= 0) return [line];
  const crossing = run.from + ((run.to - run.from) * before) / (before - after);
  if (crossing - run.from < SAME_POINT) return [after > 0 ? line : run];
  if (run.to - crossing < SAME_POINT) return [before > 0 ? line : run];
  const [first, second] = before > 0 ? [line, run] : [run, line];
  return [part(first, run.from, crossing), part(second, crossing, run.to)];
}

function tabLine({ from, to }: HeightRun, tab: TabLift): HeightRun | null {
  const middle = (from + to) / 2;
  if (Math.abs(middle - tab.at) <= tab.half) return { from, to, zFrom: tab.top, zTo: tab.top };
  if (tab.slope >= 90) return null;
  const fall = Math.tan(tab.slope * DEGREES);
  const z = (at: number) => tab.top - (Math.abs(at - tab.at) - tab.half) * fall;
  return { from, to, zFrom: z(from), zTo: z(to) };
}
