import { SAME_POINT } from '@/lib/base/tolerances';
import { distance } from '@/lib/geometry/vec';
import type { LeadPieces } from './leads';
import { clearOfTabs, runStretch, zigzag, type Laps } from './laps';
import type { MoveWriter } from './move-writer';
import { sliceTrack, trackOfPieces } from './track';

/** The ramp uses this share of the way in, so that at no depth between two layers the cutter touches the outline. */
export const RAMP_SHARE = 0.8;

/** Where a closed track is met by its leads. */
export interface LedPlace {
  readonly at: number;
  readonly leads: LeadPieces;
}

/**
 * Cuts a closed track layer by layer with a way in and a way out at one place: down in the waste, in at depth, a whole
 * level lap, out again.
 */
export function cutLedLaps(writer: MoveWriter, laps: Laps, { at, leads }: LedPlace): void {
  const { track, top, layers, descent } = laps;
  const way = trackOfPieces(leads.start, leads.onto, false);
  const waste = trackOfPieces(leads.start, sliceTrack(way, 0, way.length * RAMP_SHARE), false);
  let z = 0 - top;
  for (const depth of layers) {
    const here = writer.position();
    if (!here || distance(here, leads.start) > SAME_POINT) writer.travelTo(leads.start);
    if (descent.angle !== null) zigzag(writer, { track: waste, tabs: [] }, z, -depth, descent.angle);
    writer.descendTo(-depth);
    writer.follow(leads.onto, -depth);
    runStretch(writer, laps, track, { from: at, to: at + track.length, zFrom: -depth, zTo: -depth });
    writer.follow(leads.off, -depth);
    z = -depth;
  }
}

/** Places of a closed track at which leads might stand, from `at` on, none over a tab. */
export function placesForLeads(laps: Laps, at: number, count: number): number[] {
  return Array.from({ length: count }, (_, i) => clearOfTabs(laps, at + (i * laps.track.length) / count));
}
