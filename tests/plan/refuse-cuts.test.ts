import { describe, expect, it } from 'vitest';
import { parseJob } from '@/lib/job/parse-job';
import { resolveJob } from '@/lib/job/resolve-job';
import { resolveOutlines } from '@/lib/outline/resolve-outlines';
import { refuseCuts } from '@/lib/plan/refuse-cuts';
import { sampleJob, withValue } from '../helpers/sample-job';

function problems(changes: Record<string, unknown>): string[] {
  const changed = Object.entries(changes).reduce((job, [path, to]) => withValue(job, path, to), sampleJob());
  const job = parseJob(changed);
  if (!job.ok) throw new Error(JSON.stringify(job.error));
  const resolved = resolveJob(job.value);
  const outlines = resolveOutlines(resolved, new Map());
  if (!outlines.ok) throw new Error(JSON.stringify(outlines.error));
  return refuseCuts(resolved, outlines.value).map(({ path }) => path);
}

describe('refuseCuts', () => {
  it('has nothing against the sample', () => expect(problems({})).toEqual([]));

  it('names leads and reliefs of a profile on the line', () => {
    const changes = {
      'cuts.2.side': 'on',
      'cuts.2.lead': { type: 'arc', length: 3 },
      'cuts.2.relief': 'dogbone',
    };
    expect(problems(changes)).toEqual(['cuts[2].lead', 'cuts[2].relief']);
    expect(problems({ ...changes, 'cuts.2.enabled': false })).toEqual([]);
  });

  it('names a rest cut that is deeper than the pocket before it', () => {
    const rest = { id: 'r', kind: 'pocket', face: 'B', outlines: ['recess'], cutter: 'flat6', rest: 'c1' };
    expect(problems({ 'cuts.1': { ...rest, depth: 7 } })).toEqual(['cuts[1].rest']);
    expect(problems({ 'cuts.1': { ...rest, depth: 6 } })).toEqual([]);
    expect(problems({ 'cuts.1': { ...rest, depth: 6, pattern: 'raster' } })).toEqual(['cuts[1].pattern']);
  });

  it('names an outline of a bore that is no circle', () => {
    const bore = {
      id: 'b',
      kind: 'bore',
      face: 'B',
      outlines: ['recess', 'part'],
      cutter: 'flat6',
      depth: 3,
    };
    expect(
      problems({ 'cuts.0': bore, 'outlines.1.shape': { type: 'ellipse', cx: 60, cy: 50, rx: 9, ry: 9 } }),
    ).toEqual(['cuts[0].outlines[1]']);
  });
});
