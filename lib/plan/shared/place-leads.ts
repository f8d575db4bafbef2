import type { Region } from '@/lib/geometry/contour';
import { regionContains } from '@/lib/geometry/measure';
import type { Vec } from '@/lib/geometry/vec';
import type { CutOf } from '@/lib/job/cut-schema';
import { growRegion, insetRegion } from './inset-region';
import type { Laps } from './laps';
import { placesForLeads, RAMP_SHARE, type LedPlace } from './laps-with-leads';
import { leadsAt } from './leads';
import { pointAt, reverseTrack, trackOfPieces, type Track } from './track';

/** Places round a track that are tried for its leads. */
const LEAD_PLACES = 48;

/** The ramp's share of a lead keeps off every line of the cutter by this share of the lead's length. */
const CLEARANCE = 0.03;

/** How far apart the places of a lead are that are looked at, mm. */
const TEST_STEP = 0.25;

/**
 * Leads at a place of a closed track where they lie in the waste altogether; null where none are wanted or none fit.
 * Then the cut goes down along the track itself.
 */
export function placeLeads(
  { lead, side, direction }: CutOf<'profile'>,
  radius: number,
  region: Region,
  laps: Laps,
  from: number,
): LedPlace | null {
  if (lead.type === 'none' || lead.length === 0 || side === 'on' || !laps.track.closed) return null;
  const isWaste = wasteTest(side, region, radius);
  const isClear = wasteTest(side, region, radius + CLEARANCE * lead.length);
  for (const at of placesForLeads(laps, from, LEAD_PLACES)) {
    const leads = leadsAt(laps.track, at, lead, direction === 'climb');
    const onto = trackOfPieces(leads.start, leads.onto, false);
    const off = reverseTrack(trackOfPieces(onto.pieces.at(-1)!.to, leads.off, false));
    if ([onto, off].every((way) => liesInWaste(way, isWaste, isClear))) return { at, leads };
  }
  return null;
}

function wasteTest(side: 'outside' | 'inside', region: Region, away: number): (p: Vec) => boolean {
  const ground = side === 'outside' ? growRegion(region, away) : insetRegion(region, away);
  return (p) => regionContains(ground, p) === (side === 'inside');
}

/** Whether a way from the waste to the outline keeps clear of everything else; only its last hair touches the outline. */
function liesInWaste(way: Track, isWaste: (p: Vec) => boolean, isClear: (p: Vec) => boolean): boolean {
  const steps = Math.max(8, Math.ceil(way.length / TEST_STEP));
  return Array.from({ length: steps }, (_, i) => i / steps).every((share) => {
    const p = pointAt(way, way.length * share);
    return share < RAMP_SHARE ? isClear(p) : isWaste(p);
  });
}
