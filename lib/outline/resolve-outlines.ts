import { fail, ok, type Result } from '@/lib/base/result';
import type { Contour, Region } from '@/lib/geometry/contour';
import type { Vec } from '@/lib/geometry/vec';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import type { Outline } from '@/lib/job/shape-schema';
import type { Problem } from '@/lib/report/problem';
import { checkOutlineUse } from './check-outline-use';
import { fillRegion } from './fill-region';
import type { FontBook } from './fonts';
import { shapeContours, type ShapeContours } from './shape-contours';
import { boardTurner, type Turner } from './turn-contours';

/** An outline of a job, drawn out in the view of one face, mm, y up. */
export interface ResolvedOutline extends ShapeContours {
  readonly id: string;
  /** What people call it: its name, or its id where it has none. */
  readonly name: string;
  /** In whose view all of this is. */
  readonly face: Face;
  /** The face that it was drawn on; where `face` is the other, contours run in the other sense. */
  readonly drawnOn: Face;
  /** Whether some contour is open: such an outline serves engraving and profiles on the line. */
  readonly open: boolean;
  /** What its closed contours fill; worked out when first asked for. */
  readonly region: Region;
}

/** All outlines of a job, ready for either face. */
export interface ResolvedOutlines {
  /** The outline in that face's view. The same object each time. Throws on an id that the job has not. */
  get(id: string, face: Face): ResolvedOutline;
}

/**
 * Draws every outline of a job and checks that each enabled cut can use its outlines. Problems name the document's own
 * place: `outlines[i].shape.d`, `outlines[i].shape.font`, `cuts[i].outlines[j]`.
 */
export function resolveOutlines(job: Job, fonts: FontBook): Result<ResolvedOutlines, Problem[]> {
  const problems: Problem[] = [];
  const drawn = new Map<string, { outline: Outline; shape: ShapeContours }>();
  job.outlines.forEach((outline, index) => {
    const shape = shapeContours(outline.shape, fonts);
    if (shape.ok) drawn.set(outline.id, { outline, shape: shape.value });
    else problems.push({ ...shape.error, path: `outlines[${index}].shape.${shape.error.path}` });
  });
  problems.push(...checkOutlineUse(job, (id) => drawn.get(id)?.shape));
  if (problems.length > 0) return fail(problems);

  const turner = boardTurner(job);
  const ready = new Map<string, ResolvedOutline>();
  const resolve = (id: string, face: Face): ResolvedOutline => {
    const entry = drawn.get(id);
    if (!entry) throw new Error(`No outline '${id}'`);
    const { outline, shape } = entry;
    return outline.face === face
      ? asDrawn(outline, shape)
      : carriedOver(ready.get(key(id, outline.face)) ?? remember(id, outline.face), turner);
  };
  const remember = (id: string, face: Face): ResolvedOutline => {
    const resolved = resolve(id, face);
    ready.set(key(id, face), resolved);
    return resolved;
  };
  return ok({ get: (id, face) => ready.get(key(id, face)) ?? remember(id, face) });
}

function key(id: string, face: Face): string {
  return `${face} ${id}`;
}

function asDrawn(outline: Outline, shape: ShapeContours): ResolvedOutline {
  return resolved(outline, outline.face, shape, () => fillRegion(shape));
}

function carriedOver(own: ResolvedOutline, turner: Turner): ResolvedOutline {
  const contours: readonly Contour[] = own.contours.map(turner.contour);
  const points: readonly Vec[] = own.points.map(turner.point);
  const { fillRule, groups, missingGlyphs } = own;
  const outline = { id: own.id, name: own.name, face: own.drawnOn };
  return resolved(
    outline,
    own.face === 'A' ? 'B' : 'A',
    { contours, points, fillRule, groups, missingGlyphs },
    // Turned, not filled anew: both faces see the same polygon.
    () => turner.region(own.region),
  );
}

function resolved(
  { id, name, face: drawnOn }: Pick<Outline, 'id' | 'name' | 'face'>,
  face: Face,
  shape: ShapeContours,
  fill: () => Region,
): ResolvedOutline {
  let region: Region | null = null;
  return {
    ...shape,
    id,
    name: name === '' ? id : name,
    face,
    drawnOn,
    open: shape.contours.some(({ closed }) => !closed),
    get region() {
      return (region ??= fill());
    },
  };
}
