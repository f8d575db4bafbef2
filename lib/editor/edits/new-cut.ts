import { assertNever } from '@/lib/base/assert-never';
import { CUTTERS_FOR } from '@/lib/job/check-references';
import { cut as cutSchema, type Cut, type CutKind } from '@/lib/job/cut-schema';
import type { Job } from '@/lib/job/job-schema';
import type { Cutter } from '@/lib/job/machine-schema';
import type { Face } from '@/lib/job/numbers';
import { turnCorner } from '@/lib/job/turn';
import { newId, newName } from './new-id';

/** What people call each kind of cut, in menus and as a new cut's name. */
export const CUT_NAMES: Readonly<Record<CutKind, string>> = {
  pocket: 'Pocket',
  profile: 'Cut-out',
  chamfer: 'Chamfer',
  engrave: 'Engraving',
  'taper-engrave': 'Taper engraving',
  drill: 'Holes',
  bore: 'Bore',
  surface: 'Surfacing',
};

/** Cutters of the document that can make this kind of cut, in its order. */
export function cuttersFor(job: Job, kind: CutKind): readonly Cutter[] {
  return job.cutters.filter((cutter) => CUTTERS_FOR[kind].includes(cutter.kind));
}

/**
 * The job with a new cut, placed before the first cut-out of its face so that the part stays held, and the cut's id;
 * null where no cutter of the document can make that kind.
 */
export function addCut(
  job: Job,
  kind: CutKind,
  face: Face,
  outlines: readonly string[],
): { job: Job; id: string } | null {
  const cutter = cuttersFor(job, kind)[0];
  if (!cutter) return null;
  const id = newId(
    kind,
    job.cuts.map((cut) => cut.id),
  );
  const name = newName(
    CUT_NAMES[kind],
    job.cuts.map((cut) => cut.name),
  );
  const base = { id, name, face, outlines: [...outlines], cutter: cutter.id };
  const cut = cutSchema.parse({ ...base, ...firstFigures(kind, job, cutter) });
  const order = job.order.includes(face) ? job.order : [...job.order, face];
  const setups = job.setups[face] ? job.setups : { ...job.setups, [face]: twinSetup(job, face) };
  return { job: { ...job, order, setups, cuts: inPlace(job.cuts, cut) }, id };
}

/** Figures that suit the board, to start from. */
function firstFigures(kind: CutKind, job: Job, cutter: Cutter): Record<string, unknown> {
  const third = Math.max(0.5, Math.round(job.board.z / 3));
  switch (kind) {
    case 'pocket':
      return { kind, depth: third };
    case 'profile':
      return {
        kind,
        side: 'outside',
        depth: 'through',
        tabs: { length: 8, height: 'auto', hold: 3, placement: { type: 'count', count: 4 } },
      };
    case 'chamfer':
      return { kind, side: 'outside', width: Math.min(2, cutter.diameter / 4) };
    case 'engrave':
      return { kind, depth: Math.min(1, job.board.z / 4) };
    case 'taper-engrave':
      return { kind, depth: Math.min(3, job.board.z / 3) };
    case 'drill':
    case 'bore':
      return { kind, depth: third };
    case 'surface':
      return { kind, depth: Math.min(0.5, job.board.z / 10) };
    default:
      return assertNever(kind, 'kind of cut');
  }
}

function inPlace(cuts: readonly Cut[], cut: Cut): Cut[] {
  const cutOut =
    cut.kind === 'profile' ? -1 : cuts.findIndex(({ kind, face }) => kind === 'profile' && face === cut.face);
  return cutOut < 0 ? [...cuts, cut] : [...cuts.slice(0, cutOut), cut, ...cuts.slice(cutOut)];
}

/** A set-up for the face that has none yet, its zero on the same physical corner as the other's. */
function twinSetup(job: Job, face: Face): NonNullable<Job['setups'][Face]> {
  const other = job.setups[face === 'A' ? 'B' : 'A'];
  if (!other) return { zero: { corner: 'front-left', z: 'surface' }, clamps: [] };
  return { zero: { corner: turnCorner(job.turn.axis, other.zero.corner), z: other.zero.z }, clamps: [] };
}
