import { checkCancelled } from '@/lib/base/cancel';
import type { Region } from '@/lib/geometry/contour';
import { cutFloor } from '@/lib/job/cut-values';
import type { ResolvedOutline } from '@/lib/outline/resolve-outlines';
import type { Finding } from '@/lib/report/report';
import { cutFinding, cutName, planOf, startPlace, type CutPlan, type CutWork } from '../shared/cut-work';
import { descentAlong, plungeFindings } from '../shared/entry';
import { relieveCorners, wallsOf } from '../shared/corner-relief';
import { cutLaps, type Laps } from '../shared/laps';
import { cutLedLaps } from '../shared/laps-with-leads';
import { placeLeads } from '../shared/place-leads';
import { growRegion, insetRegion } from '../shared/inset-region';
import { layerDepths } from '../shared/layers';
import { createMoveWriter, type MoveWriter } from '../shared/move-writer';
import { narrowOpenings } from '../shared/narrow-openings';
import { orderInsideOut } from '../shared/order-tracks';
import { trackOfContour, tracksOfRegion } from '../shared/outline-tracks';
import { nearestOnTrack, reverseTrack, type Track } from '../shared/track';
import { placeTabs } from '../tabs/place-tabs';
import { raiseTab, type RaisedTab } from '../tabs/tab-heights';

type ProfileWork = CutWork<'profile'>;

/** One line of the cutter round or along an outline. */
interface ProfileLine {
  readonly outline: ResolvedOutline;
  readonly track: Track;
  readonly tabs: readonly RaisedTab[];
}

/**
 * Cuts along outlines: outside them (the region is the part), inside (the region is the hole) or on the line. In
 * layers, the last at the floor; inner lines first; over tabs the cutter is lifted on every layer below their top.
 */
export function planProfile(work: ProfileWork): CutPlan {
  const { cut } = work;
  const findings: Finding[] = [];
  const rough = linesOf(work, cut.allowance, findings);
  const finish = cut.finish ? linesOf(work, 0, []) : [];
  const writer = createMoveWriter(work.limits);
  for (const line of orderInsideOut(rough, startPlace(work))) cutLine(writer, work, line, findings);
  for (const line of orderInsideOut(finish, startPlace(work))) finishLine(writer, work, line);
  const places = rough.flatMap(({ tabs }) => tabs.map(({ place }) => place));
  return planOf(work, writer.finish(), findings, places);
}

function linesOf(work: ProfileWork, allowance: number, findings: Finding[]): ProfileLine[] {
  return work.outlines.flatMap((outline) => {
    checkCancelled(work.control);
    const tracks = tracksAlong(work, outline, allowance);
    findings.push(...doesNotFit(work, outline, allowance));
    const tabs = tabsOf(work, outline, tracks, allowance);
    return tracks.map((track) => ({ outline, track, tabs: tabs.filter((tab) => tab.track === track) }));
  });
}

/** The cutter's lines of one outline, run in the direction asked for. */
function tracksAlong({ cut, cutter }: ProfileWork, outline: ResolvedOutline, allowance: number): Track[] {
  if (cut.side === 'on') return outline.contours.map(trackOfContour).filter(({ length }) => length > 0);
  const offset = cutter.diameter / 2 + allowance;
  const region =
    cut.side === 'outside'
      ? growRegion(outline.region, offset, cut.corners)
      : insetRegion(outline.region, offset);
  // Rings run with their area on the left. Climb keeps the wood that stays on the right (spindle clockwise).
  const climbsAsDrawn = cut.side === 'inside';
  const asDrawn = climbsAsDrawn === (cut.direction === 'climb');
  const relieve = reliefOf(cut, cutter.diameter / 2 + allowance, outline.region);
  return tracksOfRegion(region).map((track) => (asDrawn ? relieve(track) : reverseTrack(relieve(track))));
}

/** Detours into inner corners, where they were asked for: they turn left along a hole's ring and right along a part's. */
function reliefOf(cut: ProfileWork['cut'], radius: number, region: Region): (track: Track) => Track {
  if (cut.relief === 'none') return (track) => track;
  const walls = wallsOf(region);
  return (track) => relieveCorners(track, cut.side === 'inside' ? 'left' : 'right', radius, walls);
}

function tabsOf(
  work: ProfileWork,
  outline: ResolvedOutline,
  tracks: readonly Track[],
  allowance: number,
): RaisedTab[] {
  const { cut, cutter, job, farDepth } = work;
  if (!cut.tabs || !farDepth || tracks.length === 0) return [];
  const cutterRadius = cutter.diameter / 2;
  const offset = cut.side === 'on' ? 0 : cutterRadius + allowance;
  const raise = {
    cut: cut.id,
    tabs: cut.tabs,
    boardThickness: job.board.z,
    cutterRadius,
    farDepth,
  };
  const floor = -cutFloor(job, cut);
  return placeTabs(cut.tabs, { outline, tracks, offset, cutterRadius })
    .map((placed) => raiseTab(placed, raise))
    .filter(({ lift }) => floor < lift.top);
}

function cutLine(writer: MoveWriter, work: ProfileWork, line: ProfileLine, findings: Finding[]): void {
  checkCancelled(work.control);
  const { job, cut, stepdown } = work;
  const descent = descentAlong(work, cut.entry, line.track.length);
  findings.push(...plungeFindings(work, descent, line.track.start));
  const layers = layerDepths(cut.start, cutFloor(job, cut), stepdown);
  const tabs = line.tabs.map(({ lift }) => lift);
  const laps = { track: line.track, top: cut.start, layers, descent, tabs };
  runLaps(writer, work, line.outline, laps);
}

function runLaps(writer: MoveWriter, work: ProfileWork, outline: ResolvedOutline, laps: Laps): void {
  const from = startOf(writer, laps.track);
  const led = placeLeads(work.cut, work.cutter.diameter / 2, outline.region, laps, from);
  if (led) cutLedLaps(writer, laps, led);
  else cutLaps(writer, laps, from);
}

/** One pass at full depth along the wall itself. */
function finishLine(writer: MoveWriter, work: ProfileWork, { track, tabs, outline }: ProfileLine): void {
  checkCancelled(work.control);
  runLaps(writer, work, outline, {
    track,
    top: work.cut.start,
    layers: [cutFloor(work.job, work.cut)],
    descent: { angle: null },
    tabs: tabs.map(({ lift }) => lift),
  });
}

function startOf(writer: MoveWriter, track: Track): number {
  const from = writer.position();
  return from && track.closed ? nearestOnTrack(track, from).at : 0;
}

/** Holes and pieces of an outline that are too narrow for the cutter altogether. */
function doesNotFit(work: ProfileWork, outline: ResolvedOutline, allowance: number): Finding[] {
  const { cut, cutter } = work;
  if (cut.side === 'on') return [];
  return narrowOpenings(outline.region, cut.side, cutter.diameter / 2 + allowance).map((opening) => {
    const message = `${cutName(work)}: ${cutter.name} does not fit into an opening of '${outline.name}'.`;
    return cutFinding(work, 'cutter-too-large', message, opening[0]?.[0]);
  });
}
