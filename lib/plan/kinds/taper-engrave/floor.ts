import { differenceRegions, unionRegions } from '@/lib/geometry/boolean';
import type { Region } from '@/lib/geometry/contour';
import { strokePolyline } from '@/lib/geometry/offset';
import { cutterById } from '@/lib/job/cut-values';
import type { Position } from '@/lib/moves/move';
import { moveLimits, type CutStep, type CutWork } from '../../shared/cut-work';
import { insetRegion } from '../../shared/inset-region';
import { layerDepths } from '../../shared/layers';
import { createMoveWriter } from '../../shared/move-writer';
import { trackPoints, type Track } from '../../shared/track';
import { tracksOfRegion } from '../../shared/outline-tracks';
import { clearGround } from '../../clearing/clear-ground';
import { openRegion, withoutSlivers } from '../../clearing/open-region';
import { restPasses } from '../../clearing/rest-passes';

type TaperWork = CutWork<'taper-engrave'>;

/** Chords of the V-bit's rounds, mm. */
const ROUND_CHORD = 0.002;

/** Neighbouring passes count as overlapping by this, mm. */
const MEETING = 0.02;

/** What the floor's own cutter does, and what of the floor it leaves. */
export interface ClearedFloor {
  readonly steps: readonly CutStep[];
  readonly left: Region;
}

/** Clears a flat floor with a flat cutter, with that cutter's own speeds. */
export function clearFloor(work: TaperWork, floor: Region, cutterId: string): ClearedFloor {
  const { job, cut } = work;
  const cutter = cutterById(job, cutterId);
  const { feed, plunge, stepdown, stepover } = cutter.speeds;
  const radius = cutter.diameter / 2;
  const ground = insetRegion(floor, radius);
  if (ground.length === 0) return { steps: [], left: floor };
  const writer = createMoveWriter(moveLimits(job, feed, plunge));
  const depths = layerDepths(cut.start, cut.start + cut.depth, stepdown);
  clearGround(
    writer,
    {
      ...work,
      cutter,
      spacing: stepover * cutter.diameter,
      conventional: false,
      entry: { type: 'ramp', angle: 5 },
    },
    ground,
    depths,
  );
  const moves = writer.finish();
  const steps = moves.length > 0 ? [{ cutter: cutterId, moves }] : [];
  return { steps, left: withoutSlivers(differenceRegions(floor, openRegion(floor, radius))) };
}

/**
 * The V-bit's passes at the limit: once round every edge of the floor, which finishes the walls, and over what is left
 * of the floor at the V-bit's own step-over, so that no ridge is higher than step-over · D / (2 tan α).
 */
export function floorPasses(work: TaperWork, floor: Region, left: Region): Position[][] {
  const { cut, cutter, control } = work;
  const z = -(cut.start + cut.depth);
  const spacing = cutter.speeds.stepover * cutter.diameter;
  // Half the spacing on either side of a pass counts as cleared, and a hair more so that neighbours meet.
  const reach = spacing / 2 + MEETING;
  const rounds = floor.map((ring) => strokePolyline({ points: ring, closed: true }, spacing / 2));
  const open = withoutSlivers(differenceRegions(left, unionRegions(rounds)));
  const over = restPasses(insetRegion(floor, spacing), open, reach, spacing, control, floor).flat();
  return [...tracksOfRegion(floor), ...over].map((track) => positionsAt(track, z));
}

function positionsAt(track: Track, z: number): Position[] {
  const points = trackPoints(track, ROUND_CHORD);
  const first = points[0];
  const closed = track.closed && first ? [...points, first] : points;
  return closed.map(({ x, y }) => ({ x, y, z }));
}
