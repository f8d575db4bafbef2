import type { Descent } from './entry';
import { rampLength } from './entry';
import { followRuns, liftOverTabs, liftReach, type HeightRun, type TabLift } from './height-run';
import type { MoveWriter } from './move-writer';
import { pointAt, reverseTrack, type Track } from './track';

/** A track cut in layers. Depths are mm below the face, growing. */
export interface Laps {
  readonly track: Track;
  /** Where the wood begins. */
  readonly top: number;
  readonly layers: readonly number[];
  readonly descent: Descent;
  readonly tabs: readonly TabLift[];
}

/**
 * Cuts a track layer by layer, from where `at` (a length along a closed track) lies. On a closed track the ramp of a
 * layer goes on from the lap before, and a whole level lap follows it, so no slope is left behind. An open track is
 * always run from its start: the ramp goes to and fro there, then the level pass runs as drawn.
 */
export function cutLaps(writer: MoveWriter, laps: Laps, at = 0): void {
  if (laps.track.closed) cutClosed(writer, laps, clearOfTabs(laps, at));
  else cutOpen(writer, laps);
}

function cutClosed(writer: MoveWriter, laps: Laps, start: number): void {
  const { track, top, layers, descent } = laps;
  writer.travelTo(pointAt(track, start));
  let s = start;
  let z = 0 - top;
  for (const depth of layers) {
    const ramp = descent.angle === null ? 0 : rampLength(z + depth, descent.angle);
    runStretch(writer, laps, track, { from: s, to: s + ramp, zFrom: z, zTo: -depth });
    s += ramp;
    runStretch(writer, laps, track, { from: s, to: s + track.length, zFrom: -depth, zTo: -depth });
    s -= Math.floor(s / track.length) * track.length;
    z = -depth;
  }
}

function cutOpen(writer: MoveWriter, laps: Laps): void {
  const { track, top, layers, descent } = laps;
  let z = 0 - top;
  for (const depth of layers) {
    writer.travelTo(track.start);
    if (descent.angle !== null) zigzag(writer, laps, z, -depth, descent.angle);
    runStretch(writer, laps, track, { from: 0, to: track.length, zFrom: -depth, zTo: -depth });
    z = -depth;
  }
}

/** Down at the start of an open track, to and fro in an even number of legs (real angle ≤ the one asked for). */
export function zigzag(
  writer: MoveWriter,
  laps: Pick<Laps, 'track' | 'tabs'>,
  from: number,
  to: number,
  angle: number,
): void {
  const { track, tabs } = laps;
  const whole = rampLength(from - to, angle);
  if (whole === 0) return;
  const pairs = Math.max(1, Math.ceil(whole / (2 * track.length)));
  const leg = whole / (2 * pairs);
  const turn = track.length - leg;
  const lapsBack = { ...laps, tabs: tabs.map((tab) => ({ ...tab, at: track.length - tab.at })) };
  const back = reverseTrack(track);
  for (let i = 0; i < pairs; i++) {
    const high = from + ((to - from) * i) / pairs;
    const low = from + ((to - from) * (i + 1)) / pairs;
    const middle = (high + low) / 2;
    runStretch(writer, laps, track, { from: 0, to: leg, zFrom: high, zTo: middle });
    runStretch(writer, lapsBack, back, { from: turn, to: track.length, zFrom: middle, zTo: low });
  }
}

/** A stretch with its tabs; a cutter that comes from above goes straight down to where the stretch begins. */
export function runStretch(
  writer: MoveWriter,
  { tabs }: Pick<Laps, 'tabs'>,
  track: Track,
  stretch: HeightRun,
): void {
  if (stretch.to <= stretch.from) return;
  const runs = liftOverTabs(stretch, tabs, track.closed ? track.length : Infinity);
  writer.descendTo(runs[0]?.zFrom ?? stretch.zFrom);
  followRuns(writer, track, runs);
}

/** A start that is not over a tab, so that the first descent is into the kerf. */
export function clearOfTabs({ track, tabs, layers }: Laps, at: number): number {
  const floor = -(layers.at(-1) ?? 0);
  let place = at;
  for (let tries = 0; tries <= tabs.length; tries++) {
    const hit = tabs.find((tab) => awayFrom(tab, place, track.length) < liftReach(tab, floor));
    if (!hit) return place;
    place = hit.at + liftReach(hit, floor) + 0.1;
  }
  return at;
}

function awayFrom(tab: TabLift, at: number, lap: number): number {
  const d = Math.abs(at - tab.at) % lap;
  return Math.min(d, lap - d);
}
