import { describe, expect, it } from 'vitest';
import type { JobInput } from '@/lib/job/job-schema';
import { parseJob } from '@/lib/job/parse-job';
import { planJob } from '@/lib/pipeline/plan-job';
import { FINDING_CODES, type FindingCode } from '@/lib/report/finding-codes';
import type { Finding } from '@/lib/report/report';
import { sampleJob, withValue } from '../helpers/sample-job';

function findingsOf(job: JobInput): readonly Finding[] {
  const parsed = parseJob(job);
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.error));
  const planned = planJob(parsed.value, new Map());
  if (!planned.ok) throw new Error(JSON.stringify(planned.error));
  return planned.value.report.findings;
}

it('a job that is right in every part has none', () => {
  expect(findingsOf(sampleJob())).toEqual([]);
});

/**
 * Face B's bevel of 2 mm by a 60° point goes 2 / tan 30° + 0.5 = 3.96 mm deep under the tabs (elementary geometry), so a
 * tab of height h keeps h − 3.96 mm of wood.
 */
describe('each finding has a job that raises it and a near twin that does not', () => {
  it.each<[FindingCode, string, unknown, unknown]>([
    ['tab-without-wood', 'cuts.2.tabs.height', 4.3, 7.1],
    ['tab-thin', 'cuts.2.tabs.height', 6.8, 7.1],
    [
      'part-loose',
      'cuts.2.tabs',
      null,
      { length: 8, height: 'auto', placement: { type: 'count', count: 4 } },
    ],
    ['outside-travel', 'machine.travel.x', 150, 200],
    ['below-bed', 'cuts.2.below', 1.2, 0.9],
    ['cutter-too-long-cut', 'cutters.0.fluteLength', 18, 19],
    ['cutter-too-small', 'cuts.1.width', 2.9, 2.6],
    ['turn-mismatch', 'setups.B.zero.corner', 'front-left', 'back-left'],
    ['cut-out-too-early', 'order', ['A', 'B'], ['B', 'A']],
  ])('%s: %s', (code, path, wrong, right) => {
    const found = findingsOf(withValue(sampleJob(), path, wrong));
    const own = found.filter((finding) => finding.code === code);
    expect(own.length).toBeGreaterThan(0);
    expect(own[0]?.severity).toBe(FINDING_CODES[code].severity);
    expect(own[0]?.message).toMatch(/\.$/);
    if (code !== 'turn-mismatch' && code !== 'outside-travel') expect(own[0]?.cut).toBeDefined();
    expect(findingsOf(withValue(sampleJob(), path, right)).map((finding) => finding.code)).not.toContain(
      code,
    );
  });

  it('tabs say where they are and what is left in them', () => {
    const found = findingsOf(withValue(sampleJob(), 'cuts.2.tabs.height', 6.8));
    const [tab] = found.filter(({ code }) => code === 'tab-thin');
    expect(tab?.at).toHaveLength(2);
    expect(tab?.face).toBe('A');
    // 6.8 − 3.96 = 2.84.
    expect(tab?.message).toMatch(/2\.8/);
  });
});
