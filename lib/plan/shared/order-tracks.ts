import type { Ring } from '@/lib/geometry/contour';
import { orderTour } from '@/lib/geometry/tour';
import { ringContains } from '@/lib/geometry/measure';
import type { Vec } from '@/lib/geometry/vec';
import { trackPoints, type Track } from './track';

/** Chords for telling which track lies inside which: coarse is enough. */
const NESTING_CHORD = 0.1;

/**
 * Tracks in an order of little travel in which every closed track comes after those that lie inside it, so that what a
 * part holds is cut before the part itself.
 */
export function orderInsideOut<T extends { readonly track: Track }>(items: readonly T[], from: Vec): T[] {
  const groups = new Map<number, T[]>();
  const rings = items.map(({ track }) => (track.closed ? trackPoints(track, NESTING_CHORD) : null));
  items.forEach((item, i) => {
    const depth = rings.filter((ring, j) => i !== j && ring && holds(ring, item.track.start)).length;
    groups.set(depth, [...(groups.get(depth) ?? []), item]);
  });
  const depths = [...groups.keys()].sort((a, b) => b - a);
  const out: T[] = [];
  for (const depth of depths) {
    const group = groups.get(depth)!;
    const last = out.at(-1);
    const stops = group.map(({ track }) => ({ entry: track.start, exit: trackEnd(track) }));
    const tour = orderTour(stops, last ? trackEnd(last.track) : from);
    out.push(...tour.map(({ index }) => group[index]!));
  }
  return out;
}

/** Where a track ends: a closed one where it starts. */
export function trackEnd(track: Track): Vec {
  return track.closed ? track.start : (track.pieces.at(-1)?.to ?? track.start);
}

function holds(ring: Ring, p: Vec): boolean {
  return ring.length > 2 && ringContains(ring, p);
}
