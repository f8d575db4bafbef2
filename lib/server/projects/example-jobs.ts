import 'server-only';
import type { ExampleId } from '@/lib/contracts/project';
import type { Job } from '@/lib/job/job-schema';
import { emptyJob } from './empty-job';

export function exampleJob(id: ExampleId): Job {
  return emptyJob(id);
}
