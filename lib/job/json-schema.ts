import { z } from 'zod';
import { jobSchema } from './job-schema';

/** JSON Schema (draft 2020-12) of a job document as a file may hold it, defaults left out. */
export function jobJsonSchema(): object {
  return z.toJSONSchema(jobSchema, { io: 'input', target: 'draft-2020-12' });
}
