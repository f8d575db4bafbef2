import type { Cut } from '@/lib/job/cut-schema';
import type { Job } from '@/lib/job/job-schema';
import type { ResolvedOutlines } from '@/lib/outline/resolve-outlines';
import type { Problem } from '@/lib/report/problem';
import { circlesOf } from './shared/outline-circles';

/** What planning cannot do with a document that is otherwise right, by place: it is refused, never left out silently. */
export function refuseCuts(job: Job, outlines: ResolvedOutlines): Problem[] {
  return job.cuts.flatMap((cut, index) =>
    cut.enabled ? [...refuseOptions(cut, index), ...refuseBores(cut, index, outlines)] : [],
  );
}

function refuseOptions(cut: Cut, index: number): Problem[] {
  const refuse = (key: string, what: string): Problem => ({
    path: `cuts[${index}].${key}`,
    message: `${what} cannot be planned yet.`,
  });
  if (cut.kind === 'pocket') {
    return [
      ...(cut.pattern === 'raster' ? [refuse('pattern', 'a raster pocket')] : []),
      ...(cut.rest !== null ? [refuse('rest', 'a rest cut')] : []),
      ...(cut.relief !== 'none' ? [refuse('relief', 'corner relief')] : []),
    ];
  }
  if (cut.kind === 'profile') {
    return [
      ...(cut.lead.type !== 'none' ? [refuse('lead', 'a lead')] : []),
      ...(cut.relief !== 'none' ? [refuse('relief', 'corner relief')] : []),
    ];
  }
  if (cut.kind === 'taper-engrave') return [refuse('kind', 'a taper-engrave')];
  return [];
}

function refuseBores(cut: Cut, index: number, outlines: ResolvedOutlines): Problem[] {
  if (cut.kind !== 'bore') return [];
  return cut.outlines.flatMap((id, i) => {
    const outline = outlines.get(id, cut.face);
    if (circlesOf(outline)) return [];
    return [
      {
        path: `cuts[${index}].outlines[${i}]`,
        message: `'${outline.name}' is not a circle; a bore needs one.`,
      },
    ];
  });
}
