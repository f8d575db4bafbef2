import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { canonicalJob, jobHash } from '@/lib/job/canonical';
import type { Job } from '@/lib/job/job-schema';
import { jobJsonSchema } from '@/lib/job/json-schema';
import { parseJob } from '@/lib/job/parse-job';
import { sampleJob, withValue } from '../helpers/sample-job';

function parsed(value: unknown): Job {
  const result = parseJob(value);
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
}

describe('the canonical document and its hash', () => {
  it('is the SHA-256 of the canonical text (independent: node:crypto)', () => {
    const job = parsed(sampleJob());
    expect(jobHash(job)).toBe(createHash('sha256').update(canonicalJob(job)).digest('hex'));
  });

  it.each<[string, string, unknown]>([
    ['board.grain', 'board.grain', 'x'],
    ['turn', 'turn', { axis: 'x' }],
    ['decimals of mm', 'machine.controller.decimals', 4],
    ['step-over of the cutter', 'cuts.0.stepover', 0.45],
    ['below of a through cut', 'cuts.2.below', 0.3],
    ['follow where nothing is measured', 'cuts.1.follow', 'flat'],
    ['the hold of tabs', 'cuts.2.tabs.hold', 3],
    ['a run-out that is on', 'cuts.0.runOut', true],
    ['an empty name', 'cuts.0.name', ''],
  ])('does not change when %s is spelled out as its default', (_what, path, to) => {
    expect(jobHash(parsed(withValue(sampleJob(), path, to)))).toBe(jobHash(parsed(sampleJob())));
  });

  it.each<[string, unknown]>([
    ['cuts.0.depth', 6.01],
    ['name', 'Other'],
    ['cuts.2.tabs.hold', 4],
  ])('changes with %s', (path, to) => {
    expect(jobHash(parsed(withValue(sampleJob(), path, to)))).not.toBe(jobHash(parsed(sampleJob())));
  });

  it('can be read again and gives itself', () => {
    const text = canonicalJob(parsed(sampleJob()));
    expect(canonicalJob(parsed(JSON.parse(text)))).toBe(text);
  });
});

describe('the JSON Schema', () => {
  it('names every kind of cut and refuses unknown keys', () => {
    const text = JSON.stringify(jobJsonSchema());
    for (const kind of [
      'pocket',
      'profile',
      'chamfer',
      'engrave',
      'taper-engrave',
      'drill',
      'bore',
      'surface',
    ])
      expect(text).toContain(`"const":"${kind}"`);
    expect(jobJsonSchema()).toMatchObject({ type: 'object', additionalProperties: false });
  });
});
