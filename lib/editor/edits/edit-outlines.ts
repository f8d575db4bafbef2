import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import type { Outline, Shape, ShapeType } from '@/lib/job/shape-schema';
import { moveShape } from './move-shape';
import { newId, newName } from './new-id';

const SHAPE_NAMES: Readonly<Record<ShapeType, string>> = {
  path: 'Outline',
  rect: 'Rectangle',
  ellipse: 'Ellipse',
  polygon: 'Polygon',
  points: 'Points',
  text: 'Text',
};

/** The job with a new outline last, and the outline's id. */
export function addOutline(
  job: Job,
  face: Face,
  shape: Shape,
  name = SHAPE_NAMES[shape.type],
): { job: Job; id: string } {
  const id = newId(
    shape.type,
    job.outlines.map((outline) => outline.id),
  );
  const outline: Outline = {
    id,
    name: newName(
      name,
      job.outlines.map((other) => other.name),
    ),
    face,
    shape,
  };
  return { job: { ...job, outlines: [...job.outlines, outline] }, id };
}

/** The job with the shapes of these outlines replaced by what `edit` makes of them. */
export function editShapes(job: Job, ids: readonly string[], edit: (outline: Outline) => Shape): Job {
  const chosen = new Set(ids);
  const outlines = job.outlines.map((outline) =>
    chosen.has(outline.id) ? { ...outline, shape: edit(outline) } : outline,
  );
  return { ...job, outlines };
}

/** Moves outlines by a vector that is seen on `face`; those drawn on the other face go where the wood goes. */
export function moveOutlines(job: Job, ids: readonly string[], face: Face, dx: number, dy: number): Job {
  const flip = job.turn.axis === 'x' ? { x: 1, y: -1 } : { x: -1, y: 1 };
  return editShapes(job, ids, (outline) =>
    outline.face === face
      ? moveShape(outline.shape, dx, dy)
      : moveShape(outline.shape, dx * flip.x, dy * flip.y),
  );
}

export function renameOutline(job: Job, id: string, name: string): Job {
  return {
    ...job,
    outlines: job.outlines.map((outline) => (outline.id === id ? { ...outline, name } : outline)),
  };
}

/** Copies of the outlines, moved a little so that they are seen, and the ids of the copies. */
export function duplicateOutlines(
  job: Job,
  ids: readonly string[],
  offset: number,
): { job: Job; ids: string[] } {
  let next = job;
  const copies: string[] = [];
  for (const { name, face, shape } of job.outlines.filter(({ id }) => ids.includes(id))) {
    const added = addOutline(next, face, moveShape(shape, offset, -offset), name === '' ? undefined : name);
    next = added.job;
    copies.push(added.id);
  }
  return { job: next, ids: copies };
}

/**
 * Takes outlines out of the document and of the cuts that use them. A cut that is left without any goes too, since it
 * would have nothing to cut; so do the tabs placed on them and a rest pocket's link to a pocket that went.
 */
export function deleteOutlines(job: Job, ids: readonly string[]): Job {
  const gone = new Set(ids);
  const outlines = job.outlines.filter(({ id }) => !gone.has(id));
  const cuts = job.cuts
    .map((cut) => {
      const left = cut.outlines.filter((id) => !gone.has(id));
      if (left.length === cut.outlines.length) return cut;
      if (cut.kind !== 'profile' || cut.tabs?.placement.type !== 'at') return { ...cut, outlines: left };
      const at = cut.tabs.placement.at.filter(({ outline }) => !gone.has(outline));
      return { ...cut, outlines: left, tabs: { ...cut.tabs, placement: { ...cut.tabs.placement, at } } };
    })
    // A surface cut without outlines would become one over the whole board: it goes with the last of its own.
    .filter((cut, index) => cut.outlines.length > 0 || job.cuts[index]?.outlines.length === 0);
  return { ...job, outlines, cuts: withoutLostRest(cuts) };
}

/** Pockets whose `rest` names a cut that is gone stand on their own. */
export function withoutLostRest(cuts: Job['cuts']): Job['cuts'] {
  const ids = new Set(cuts.map(({ id }) => id));
  return cuts.map((cut) =>
    cut.kind === 'pocket' && cut.rest !== null && !ids.has(cut.rest) ? { ...cut, rest: null } : cut,
  );
}
