import { canonicalJson } from '@/lib/base/canonical-json';
import { sha256Hex } from '@/lib/base/sha256';
import type { Job } from './job-schema';
import { resolveJob } from './resolve-job';

/** The document with every default filled in, as canonical JSON (RFC 8785). */
export function canonicalJob(job: Job): string {
  return canonicalJson(resolveJob(job));
}

/** SHA-256 of {@link canonicalJob}: the name of what the document asks for, whatever it left to defaults. */
export function jobHash(job: Job): string {
  return sha256Hex(canonicalJob(job));
}
