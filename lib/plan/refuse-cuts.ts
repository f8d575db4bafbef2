import { SIZE_TOLERANCE } from '@/lib/base/tolerances';
import type { Cut } from '@/lib/job/cut-schema';
import { cutFloor } from '@/lib/job/cut-values';
import type { Job } from '@/lib/job/job-schema';
import type { ResolvedOutlines } from '@/lib/outline/resolve-outlines';
import type { Problem } from '@/lib/report/problem';
import { circlesOf } from './shared/outline-circles';

/** What cannot be planned of a document that is otherwise right, by place: it is refused, never left out silently. */
export function refuseCuts(job: Job, outlines: ResolvedOutlines): Problem[] {
  return job.cuts.flatMap((cut, index) =>
    cut.enabled
      ? [...refuseOptions(cut, index), ...refuseBores(cut, index, outlines), ...refuseRest(job, cut, index)]
      : [],
  );
}

/** Options that say nothing together. */
function refuseOptions(cut: Cut, index: number): Problem[] {
  const refuse = (key: string, message: string): Problem => ({ path: `cuts[${index}].${key}`, message });
  if (cut.kind === 'pocket' && cut.rest !== null) {
    return [
      ...(cut.pattern === 'raster' ? [refuse('pattern', 'a rest cut follows walls; it has no raster.')] : []),
      ...(cut.relief !== 'none'
        ? [refuse('relief', 'a rest cut makes no relief; ask the earlier pocket for it.')]
        : []),
    ];
  }
  if (cut.kind === 'profile' && cut.side === 'on') {
    return [
      ...(cut.lead.type !== 'none' ? [refuse('lead', "a lead needs side 'outside' or 'inside'.")] : []),
      ...(cut.relief !== 'none' ? [refuse('relief', "a relief needs side 'outside' or 'inside'.")] : []),
    ];
  }
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

/** Below the earlier pocket's floor there are no leavings: all of the wood stands. */
function refuseRest(job: Job, cut: Cut, index: number): Problem[] {
  if (cut.kind !== 'pocket' || cut.rest === null) return [];
  const earlier = job.cuts.find(({ id }) => id === cut.rest);
  if (!earlier?.enabled || cutFloor(job, cut) <= cutFloor(job, earlier) + SIZE_TOLERANCE) return [];
  const message = `'${earlier.name || earlier.id}' is less deep than this cut, so more than its leavings would be left.`;
  return [{ path: `cuts[${index}].rest`, message }];
}
