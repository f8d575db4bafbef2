import { distance, type Vec } from './vec';

/** Work that begins at one point and ends at another. */
export interface TourItem {
  readonly entry: Vec;
  readonly exit: Vec;
  /** May be done from its exit to its entry as well. */
  readonly reversible?: boolean;
}

export interface TourStop {
  readonly index: number;
  readonly reversed: boolean;
}

/** Passes of improvement; each is O(n²), and gains beyond a few are small. */
const MOST_PASSES = 8;
/** Above this only nearest neighbours are sought: improving would take longer than it saves. */
const MOST_IMPROVED = 1500;

/**
 * An order with short travel from `from` through all items: nearest neighbour, then single items moved and stretches
 * turned round while that shortens the way. Deterministic: of equals the first wins.
 */
export function orderTour(items: readonly TourItem[], from: Vec): TourStop[] {
  const tour = nearestNeighbour(items, from);
  if (items.length < 3 || items.length > MOST_IMPROVED) return tour;
  for (let pass = 0; pass < MOST_PASSES; pass++) {
    const turned = turnStretches(tour, items, from);
    const moved = moveItems(tour, items, from);
    if (!turned && !moved) break;
  }
  return tour;
}

/** Length of the travel between items, mm, from `from`; what is done within them does not count. */
export function tourLength(tour: readonly TourStop[], items: readonly TourItem[], from: Vec): number {
  let at = from;
  let length = 0;
  for (const stop of tour) {
    length += distance(at, entryOf(items, stop));
    at = exitOf(items, stop);
  }
  return length;
}

function nearestNeighbour(items: readonly TourItem[], from: Vec): TourStop[] {
  const left = new Set(items.keys());
  const tour: TourStop[] = [];
  let at = from;
  while (left.size > 0) {
    let best: TourStop | null = null;
    let near = Number.POSITIVE_INFINITY;
    for (const index of left) {
      const item = items[index]!;
      const there = distance(at, item.entry);
      if (there < near) {
        near = there;
        best = { index, reversed: false };
      }
      const back = item.reversible ? distance(at, item.exit) : Number.POSITIVE_INFINITY;
      if (back < near) {
        near = back;
        best = { index, reversed: true };
      }
    }
    if (!best) break;
    tour.push(best);
    left.delete(best.index);
    at = exitOf(items, best);
  }
  return tour;
}

/** 2-opt where the whole stretch may be run backwards. */
function turnStretches(tour: TourStop[], items: readonly TourItem[], from: Vec): boolean {
  let improved = false;
  for (let i = 0; i < tour.length - 1; i++) {
    const before = i === 0 ? from : exitOf(items, tour[i - 1]!);
    if (!items[tour[i]!.index]!.reversible) continue;
    for (let j = i + 1; j < tour.length; j++) {
      if (!items[tour[j]!.index]!.reversible) break;
      const after = tour[j + 1];
      const old = distance(before, entryOf(items, tour[i]!)) + gap(items, tour[j]!, after);
      const now =
        distance(before, exitOf(items, tour[j]!)) +
        (after ? distance(entryOf(items, tour[i]!), entryOf(items, after)) : 0);
      if (now < old - 1e-9) {
        const stretch = tour.slice(i, j + 1).reverse();
        tour.splice(
          i,
          stretch.length,
          ...stretch.map(({ index, reversed }) => ({ index, reversed: !reversed })),
        );
        improved = true;
      }
    }
  }
  return improved;
}

/** Or-opt with single items. */
function moveItems(tour: TourStop[], items: readonly TourItem[], from: Vec): boolean {
  let improved = false;
  for (let i = 0; i < tour.length; i++) {
    const stop = tour[i]!;
    const before = i === 0 ? from : exitOf(items, tour[i - 1]!);
    const after = tour[i + 1];
    const saved =
      distance(before, entryOf(items, stop)) +
      gap(items, stop, after) -
      (after ? distance(before, entryOf(items, after)) : 0);
    if (saved <= 1e-9) continue;
    const rest = [...tour.slice(0, i), ...tour.slice(i + 1)];
    const best = bestPlace(rest, items, from, stop);
    if (best.cost < saved - 1e-9) {
      tour.splice(0, tour.length, ...rest.slice(0, best.at), best.stop, ...rest.slice(best.at));
      improved = true;
    }
  }
  return improved;
}

function bestPlace(
  rest: readonly TourStop[],
  items: readonly TourItem[],
  from: Vec,
  stop: TourStop,
): { at: number; stop: TourStop; cost: number } {
  let best = { at: 0, stop, cost: Number.POSITIVE_INFINITY };
  const ways = items[stop.index]!.reversible ? [stop, { ...stop, reversed: !stop.reversed }] : [stop];
  for (let at = 0; at <= rest.length; at++) {
    const before = at === 0 ? from : exitOf(items, rest[at - 1]!);
    const after = rest[at];
    const old = after ? distance(before, entryOf(items, after)) : 0;
    for (const way of ways) {
      const cost = distance(before, entryOf(items, way)) + gap(items, way, after) - old;
      if (cost < best.cost - 1e-12) best = { at, stop: way, cost };
    }
  }
  return best;
}

function gap(items: readonly TourItem[], stop: TourStop, after: TourStop | undefined): number {
  return after ? distance(exitOf(items, stop), entryOf(items, after)) : 0;
}

function entryOf(items: readonly TourItem[], { index, reversed }: TourStop): Vec {
  const { entry, exit } = items[index]!;
  return reversed ? exit : entry;
}

function exitOf(items: readonly TourItem[], { index, reversed }: TourStop): Vec {
  const { entry, exit } = items[index]!;
  return reversed ? entry : exit;
}
