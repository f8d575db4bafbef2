import type { Contour } from '@/lib/geometry/contour';
import { contourLength, pointAtFraction } from '@/lib/geometry/contour-length';
import { leftOf, type Vec } from '@/lib/geometry/vec';
import type { Tabs } from '@/lib/job/cut-schema';
import type { ResolvedOutline } from '@/lib/outline/resolve-outlines';
import { directionAt, nearestOnTrack, pointAt, type Track } from '../shared/track';
import { bendAround } from './track-bend';

/** How far the cutter's line may be from the outline beyond its offset and still be the line along that place, mm. */
const SAME_PLACE = 0.05;

/** Places tried on either side of the even one. */
const TRIES = 24;

/** A tab on a track, before its height is known. */
export interface PlacedTab {
  readonly outline: ResolvedOutline;
  readonly contour: number;
  readonly fraction: number;
  /** Middle of the tab on the outline. */
  readonly at: Vec;
  readonly track: Track;
  /** Length along the track to the tab's middle. */
  readonly along: number;
}

/** What placing needs to know of one outline's profile. */
export interface TabGround {
  readonly outline: ResolvedOutline;
  readonly tracks: readonly Track[];
  /** Distance of the tracks from the outline. */
  readonly offset: number;
  readonly cutterRadius: number;
}

/**
 * Places the tabs of one outline of a profile. Counted and spaced tabs stand evenly along each contour, moved by up to
 * a quarter of their spacing away from corners and tight arcs; where fewer fit, as many as fit, and none where two do
 * not. Tabs given by fraction stand exactly there.
 */
export function placeTabs(tabs: Tabs, ground: TabGround): PlacedTab[] {
  const { placement } = tabs;
  if (placement.type === 'at') {
    return placement.at.flatMap(({ outline, contour, fraction }) => {
      if (outline !== ground.outline.id) return [];
      const place = placeAt(ground, contour, fraction);
      return place ? [place] : [];
    });
  }
  const held = tabs.length + 2 * ground.cutterRadius;
  return ground.outline.contours.flatMap((contour, index) => {
    const wanted =
      placement.type === 'count'
        ? placement.count
        : Math.max(2, Math.floor(contourLength(contour) / placement.spacing + 0.5));
    return placeEvenly(ground, contour, index, wanted, held);
  });
}

function placeEvenly(
  ground: TabGround,
  contour: Contour,
  index: number,
  wanted: number,
  held: number,
): PlacedTab[] {
  const track = trackAlong(ground, contour);
  if (!track) return [];
  const fits = Math.floor(track.length / (held + 1e-6));
  const count = Math.min(wanted, fits);
  if (count < Math.min(2, wanted)) return [];
  const taken: PlacedTab[] = [];
  for (let i = 0; i < count; i++) {
    const best = bestPlace(ground, index, (i + 0.5) / count, 1 / count, held, taken);
    if (best) taken.push(best);
  }
  return taken;
}

/** The straightest free place within a quarter of the spacing; of equally straight ones the nearest to even. */
function bestPlace(
  ground: TabGround,
  contour: number,
  even: number,
  spacing: number,
  held: number,
  taken: readonly PlacedTab[],
): PlacedTab | null {
  let best: { place: PlacedTab; bend: number } | null = null;
  for (const shift of shifts(spacing / 4)) {
    const place = placeAt(ground, contour, even + shift);
    if (!place || overlaps(place, taken, held)) continue;
    const bend = bendAround(place.track, place.along, held / 2, ground.offset);
    if (bend <= 1 / (3 * ground.cutterRadius)) return place;
    if (!best || bend < best.bend - 1e-9) best = { place, bend };
  }
  return best?.place ?? null;
}

/** 0, then ever further to either side. */
function shifts(reach: number): number[] {
  const out = [0];
  for (let i = 1; i <= TRIES; i++) out.push((reach * i) / TRIES, (-reach * i) / TRIES);
  return out;
}

function placeAt(ground: TabGround, index: number, fraction: number): PlacedTab | null {
  const contour = ground.outline.contours[index];
  if (!contour) return null;
  const wrapped = contour.closed ? fraction - Math.floor(fraction) : Math.min(1, Math.max(0, fraction));
  const { point } = pointAtFraction(contour, fraction === 1 ? 1 : wrapped);
  const nearest = nearestTrack(ground.tracks, point);
  if (!nearest || nearest.distance > ground.offset + SAME_PLACE) return null;
  return {
    outline: ground.outline,
    contour: index,
    fraction: fraction === 1 ? 1 : wrapped,
    at: point,
    track: nearest.track,
    along: nearest.at,
  };
}

function nearestTrack(
  tracks: readonly Track[],
  p: Vec,
): { track: Track; at: number; distance: number } | null {
  let best: { track: Track; at: number; distance: number } | null = null;
  for (const track of tracks) {
    const near = nearestOnTrack(track, p);
    if (!best || near.distance < best.distance) best = { track, at: near.at, distance: near.distance };
  }
  return best;
}

function overlaps(place: PlacedTab, taken: readonly PlacedTab[], held: number): boolean {
  return taken.some(({ track, along }) => {
    if (track !== place.track) return false;
    const d = Math.abs(along - place.along);
    return Math.min(d, track.closed ? track.length - d : d) < held;
  });
}

/** The track that runs along most of a contour, judged at a few places. */
function trackAlong(ground: TabGround, contour: Contour): Track | null {
  const votes = new Map<Track, number>();
  for (let i = 0; i < 16; i++) {
    const near = nearestTrack(ground.tracks, pointAtFraction(contour, (i + 0.5) / 16).point);
    if (near && near.distance <= ground.offset + SAME_PLACE) {
      votes.set(near.track, (votes.get(near.track) ?? 0) + 1);
    }
  }
  let best: Track | null = null;
  for (const [track, count] of votes) if (!best || count > votes.get(best)!) best = track;
  return best;
}

/** The rectangle over which a tab stands: `held` along the track, as wide as the cutter. */
export function tabFootprint({ track, along }: PlacedTab, held: number, cutterRadius: number): Vec[] {
  const left: Vec[] = [];
  const right: Vec[] = [];
  const steps = 8;
  for (let i = 0; i <= steps; i++) {
    const s = along - held / 2 + (held * i) / steps;
    const p = pointAt(track, s);
    const n = leftOf(directionAt(track, s));
    left.push({ x: p.x + n.x * cutterRadius, y: p.y + n.y * cutterRadius });
    right.push({ x: p.x - n.x * cutterRadius, y: p.y - n.y * cutterRadius });
  }
  return [...right, ...left.reverse()];
}
