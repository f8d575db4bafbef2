import type { Cut, CutKind } from '@/lib/job/cut-schema';
import type { Job } from '@/lib/job/job-schema';
import type { Outline } from '@/lib/job/shape-schema';
import type { Problem } from '@/lib/report/problem';
import type { ShapeContours } from './shape-contours';

/** What a cut can be made along: closed contours only, any contours, or closed contours and points. */
type Use = 'closed' | 'lines' | 'places';

/**
 * Problems of outlines that a cut cannot use: open paths where closed ones are needed, points where there must be
 * lines. Disabled cuts are not looked at, nor outlines that could not be drawn.
 */
export function checkOutlineUse(job: Job, find: (id: string) => ShapeContours | undefined): Problem[] {
  const outlines = new Map(job.outlines.map((outline) => [outline.id, outline]));
  return job.cuts.flatMap((cut, c) => {
    if (!cut.enabled) return [];
    return cut.outlines.flatMap((id, o): Problem[] => {
      const outline = outlines.get(id);
      const shape = find(id);
      const message = outline && shape && unfit(cut, outline, shape);
      return message ? [{ path: `cuts[${c}].outlines[${o}]`, message }] : [];
    });
  });
}

function unfit(cut: Cut, outline: Outline, shape: ShapeContours): string | null {
  const use = needOf(cut);
  const name = `'${outline.name || outline.id}'`;
  if (shape.points.length > 0 && use !== 'places') {
    return `${name} holds points; ${described(cut)} needs ${use === 'closed' ? 'a closed path' : 'a path'}.`;
  }
  if (use !== 'lines' && shape.contours.some(({ closed }) => !closed)) {
    return `${name} is an open path; ${described(cut)} needs a closed one.`;
  }
  return null;
}

function needOf(cut: Cut): Use {
  if (cut.kind === 'drill') return 'places';
  return cut.kind === 'engrave' || (cut.kind === 'profile' && cut.side === 'on') ? 'lines' : 'closed';
}

const ARTICLES: Partial<Record<CutKind, string>> = { engrave: 'an engrave' };

function described(cut: Cut): string {
  if (cut.kind === 'profile') return `a profile with side '${cut.side}'`;
  return ARTICLES[cut.kind] ?? `a ${cut.kind}`;
}
