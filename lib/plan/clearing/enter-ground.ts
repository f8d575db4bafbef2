import type { Region } from '@/lib/geometry/contour';
import { createDistanceQuery } from '@/lib/geometry/distance-query';
import { regionContains } from '@/lib/geometry/measure';
import type { Entry } from '@/lib/job/cut-schema';
import { DEGREES, type Vec } from '@/lib/geometry/vec';
import type { Finding } from '@/lib/report/report';
import type { AnyCutWork } from '../shared/cut-work';
import { descentAlong, plungeFindings, rampLength, type Descent } from '../shared/entry';
import { followRuns } from '../shared/height-run';
import type { LinkTest } from '../shared/links';
import type { MoveWriter } from '../shared/move-writer';
import { trackOfCircle, type Track } from '../shared/track';
import { deepestPiece, somewhereIn, type InsetPiece } from './inset-rings';

/** Clearing one piece of ground after another with one cutter. */
export interface ClearingWork extends AnyCutWork {
  readonly entry: Entry;
  /** Distance of passes, mm. */
  readonly spacing: number;
  readonly conventional: boolean;
  /** What is done to passes along the walls, such as detours into corners. */
  readonly relieve?: (track: Track) => Track;
}

/** A helix is at most this share of the cutter's radius wide, so that no core stays in its middle… */
const WIDEST_HELIX = 0.9;
/** …and not narrower than this, where it would be little better than a plunge. */
const NARROWEST_HELIX = 0.3;

/** More laps of ramp than this on one pass are worse than another way down. */
const MOST_RAMP_LAPS = 12;

/** How a piece of ground is entered on every layer: a helix beside the first pass, or along a pass. */
export type GroundEntry =
  | { readonly kind: 'helix'; readonly circle: Track; readonly angle: number }
  | { readonly kind: 'along'; readonly track: Track; readonly descent: Descent };

/**
 * Chooses how to go down: a helix where one is asked for and fits, else a ramp along the innermost pass that is long
 * enough for it and from which the first pass can be reached, else straight down.
 */
export function chooseEntry(
  work: ClearingWork,
  piece: InsetPiece,
  passes: readonly Track[],
  mayLink: LinkTest,
  height: number,
): GroundEntry {
  const { entry, cutter } = work;
  const first = passes[0]!;
  if (entry.type === 'helix') {
    const circle = helixCircle(
      piece.region,
      deepestPiece(piece).region,
      cutter.diameter / 2,
      first.start,
      mayLink,
    );
    if (circle) return { kind: 'helix', circle, angle: entry.angle };
  }
  const ramp = rampLength(height, entry.angle);
  const isLongEnough = ({ length }: Track) => length * MOST_RAMP_LAPS >= ramp;
  const reachable = passes.filter((track, i) => i === 0 || mayLink(track.start, first.start));
  const track = reachable.find(isLongEnough) ?? first;
  const descent = isLongEnough(track)
    ? descentAlong(work, entry, track.length)
    : descentAlong(work, entry, 0);
  return { kind: 'along', track: descent.angle === null ? first : track, descent };
}

/** Where the cutter stands before it goes down. */
export function entryPlace(entry: GroundEntry): Vec {
  return entry.kind === 'helix' ? entry.circle.start : entry.track.start;
}

/**
 * Goes down from `z` to `floor` and tells how far along the entry's track that led (0 after a helix). The slope that is
 * left behind lies on ground that the passes cut afterwards. On a track other than the first pass the ramp takes whole
 * laps, so that it ends where a link to the first pass is known to be free.
 */
export function goDown(
  writer: MoveWriter,
  entry: GroundEntry,
  z: number,
  floor: number,
  wholeLaps: boolean,
): number {
  if (entry.kind === 'helix') {
    const { circle, angle } = entry;
    const turns = Math.max(1, Math.ceil((z - floor) / (circle.length * Math.tan(angle * DEGREES))));
    followRuns(writer, circle, [{ from: 0, to: turns * circle.length, zFrom: z, zTo: floor }]);
    return 0;
  }
  const { track, descent } = entry;
  if (descent.angle === null) {
    writer.feedTo(track.start, floor);
    return 0;
  }
  const least = rampLength(z - floor, descent.angle);
  const ramp = wholeLaps ? Math.ceil(least / track.length) * track.length : least;
  followRuns(writer, track, [{ from: 0, to: ramp, zFrom: z, zTo: floor }]);
  return ramp;
}

/** The finding of an entry that has to plunge with a cutter that cannot. */
export function entryFindings(work: AnyCutWork, entry: GroundEntry): Finding[] {
  return entry.kind === 'helix' ? [] : plungeFindings(work, entry.descent, entry.track.start);
}

function helixCircle(
  ground: Region,
  deepest: Region,
  radius: number,
  next: Vec,
  mayLink: LinkTest,
): Track | null {
  const center = somewhereIn(deepest);
  if (!regionContains(ground, center)) return null;
  const room = createDistanceQuery(ground).distance(center);
  if (room < NARROWEST_HELIX * radius) return null;
  const circle = trackOfCircle(center, Math.min(room, WIDEST_HELIX * radius), true);
  return mayLink(circle.start, next) ? circle : null;
}
