import type { Problem } from '@/lib/report/problem';
import { type Result, fail, ok } from '@/lib/base/result';
import { checkReferences } from './check-references';
import { describeIssues } from './describe-issue';
import { type Job, jobSchema } from './job-schema';
import { migrateDocument } from './migrate-document';

/**
 * Reads a job document: brings older versions up, checks it against the schema, fills in the plain defaults and checks
 * what its parts say of one another. Every problem names its key and says what would be right.
 */
export function parseJob(value: unknown): Result<Job, Problem[]> {
  const migrated = migrateDocument(value);
  if (!migrated.ok) return migrated;
  const parsed = jobSchema.safeParse(migrated.value);
  if (!parsed.success) return fail(describeIssues(parsed.error.issues, migrated.value));
  const problems = checkReferences(parsed.data);
  return problems.length > 0 ? fail(problems) : ok(parsed.data);
}

/** {@link parseJob} of a file's text; broken JSON is a problem of the document itself (`$`). */
export function parseJobText(text: string): Result<Job, Problem[]> {
  let value: unknown;
  try {
    value = JSON.parse(text.startsWith('\uFEFF') ? text.slice(1) : text);
  } catch (error) {
    const reason = error instanceof Error ? error.message.replace(/\s+/g, ' ') : 'unreadable';
    return fail([{ path: '$', message: `is not JSON: ${reason}` }]);
  }
  return parseJob(value);
}

/** One line a problem, as the command line prints it and a dialog lists it. */
export function problemLine({ path, message }: Problem): string {
  return `${path}: ${message}`;
}
