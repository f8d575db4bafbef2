import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { Face } from '@/lib/job/numbers';
import type { ProjectAccess } from '../access/project-access';
import { readJob } from '../projects/saved-job';
import { planningService } from './planning-service';

/** Nothing in it can run or load, whatever the document says. */
const HEADERS = {
  'content-type': 'image/svg+xml; charset=utf-8',
  'content-security-policy': "default-src 'none'; style-src 'unsafe-inline'; sandbox",
  'x-content-type-options': 'nosniff',
};

/** A small picture of a face of the saved document. */
export async function readPicture(
  em: EntityManager,
  access: ProjectAccess,
  face: Face,
  { signal, url }: Request,
): Promise<Response> {
  const { job, hash } = await readJob(em, access);
  const svg = await planningService().picture(job, hash, face, signal);
  const asked = new URL(url).searchParams.get('v');
  // An address that names this very document never shows another one.
  const lasting = asked !== null && asked.length >= 16 && hash.startsWith(asked);
  const caching = lasting ? 'private, max-age=31536000, immutable' : 'private, no-cache';
  return new Response(svg, { headers: { ...HEADERS, 'cache-control': caching } });
}
