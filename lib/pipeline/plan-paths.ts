import { checkCancelled, type WorkControl } from '@/lib/base/cancel';
import { fail, ok, type Result } from '@/lib/base/result';
import { jobHash } from '@/lib/job/canonical';
import type { Job } from '@/lib/job/job-schema';
import { resolveJob } from '@/lib/job/resolve-job';
import { resolveOutlines, type ResolvedOutlines } from '@/lib/outline/resolve-outlines';
import type { FontBook } from '@/lib/outline/fonts';
import { planCuts, type PlannedCuts } from '@/lib/plan/plan-cuts';
import { refuseCuts } from '@/lib/plan/refuse-cuts';
import type { Problem } from '@/lib/report/problem';
import { findMissingGlyphs } from './missing-glyphs';

/** Cutter paths of a job with what proving them needs. */
export interface PlannedPaths extends PlannedCuts {
  /** The job with every default filled in. */
  readonly job: Job;
  readonly jobHash: string;
  readonly outlines: ResolvedOutlines;
}

/**
 * The quick half of planning: job → outlines → moves. Takes a checked job (see `parseJob`); what cannot be planned comes
 * back as problems that name the document's place.
 */
export function planPaths(job: Job, fonts: FontBook, control?: WorkControl): Result<PlannedPaths, Problem[]> {
  const resolved = resolveJob(job);
  const outlines = resolveOutlines(resolved, fonts);
  if (!outlines.ok) return outlines;
  checkCancelled(control);
  const refused = refuseCuts(resolved, outlines.value);
  if (refused.length > 0) return fail(refused);
  const { steps, tabs, findings } = planCuts(resolved, outlines.value, control);
  return ok({
    job: resolved,
    jobHash: jobHash(job),
    outlines: outlines.value,
    steps,
    tabs,
    findings: [...findMissingGlyphs(resolved, outlines.value), ...findings],
  });
}
