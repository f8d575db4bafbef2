import type { Problem } from '@/lib/report/problem';
import { type Result, fail, ok } from '@/lib/base/result';
import { JOB_FORMAT, JOB_VERSION } from './job-schema';

/** What turns a document of one version into the next. Takes and gives plain JSON; never edits its argument. */
type Up = (document: Record<string, unknown>) => Record<string, unknown>;

/**
 * One entry for each version that documents were ever written in before the present one; entry n makes version n + 1
 * of version n. There is none yet: version 1 is the first.
 */
const UPS: Readonly<Record<number, Up>> = {};

/** Brings a document of an older version up to the present one. What comes back still has to be validated. */
export function migrateDocument(
  value: unknown,
  ups = UPS,
  present: number = JOB_VERSION,
): Result<unknown, Problem[]> {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    return fail([{ path: '$', message: 'must be a job document: one JSON object.' }]);
  }
  let document = value as Record<string, unknown>;
  if (document.format !== JOB_FORMAT) {
    return fail([{ path: 'format', message: `must be "${JOB_FORMAT}"; this is not a job document.` }]);
  }
  const { version } = document;
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1) {
    return fail([{ path: 'version', message: `must be a whole number from 1 to ${present}.` }]);
  }
  if (version > present) {
    const message = `is ${version}, newer than the ${present} that is known here; open it with a newer Spindleaf.`;
    return fail([{ path: 'version', message }]);
  }
  for (let from = version; from < present; from++) {
    const up = ups[from];
    if (!up) throw new Error(`No migration from version ${from}`);
    document = { ...up(document), version: from + 1 };
  }
  return ok(document);
}
