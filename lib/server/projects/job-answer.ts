import 'server-only';
import { type JobSaved, jobEtag, type SavedJob, versionOfEtag } from '@/lib/contracts/job-document';

/**
 * The job document with its ETag, or 304 to a client that holds this version. It is not parsed again: it was when it
 * was saved, and it may be large.
 */
export function jobAnswer(saved: SavedJob, ifNoneMatch: string | null): Response {
  const headers = { etag: jobEtag(saved.version), 'cache-control': 'private, no-cache' };
  const held = ifNoneMatch === null ? null : versionOfEtag(ifNoneMatch);
  return held === saved.version
    ? new Response(null, { status: 304, headers })
    : Response.json(saved, { headers });
}

export function savedAnswer(saved: JobSaved): Response {
  return Response.json(saved, { headers: { etag: jobEtag(saved.version), 'cache-control': 'no-store' } });
}
