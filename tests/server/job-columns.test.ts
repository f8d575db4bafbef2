import { expect, it } from 'vitest';
import { jobHash } from '@/lib/job/canonical';
import { exampleJob } from '@/lib/server/projects/example-jobs';
import { jobColumns } from '@/lib/server/projects/job-columns';

it('names a document as the core does', () => {
  const job = { ...exampleJob('hallway-rail'), name: 'Löffel – 27 € 🪵' };
  expect(jobColumns(job).jobHash).toBe(jobHash(job));
});
