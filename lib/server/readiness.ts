import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { Health } from '@/lib/contracts/health';
import { ALL_MIGRATIONS } from '@/migrations/all-migrations';
import { ApiError } from './http/api-error';

/** Settings without which an acknowledged save could be lost when the machine loses power (PostgreSQL manual, "WAL"). */
const SAFE_SETTINGS = ['fsync', 'full_page_writes', 'synchronous_commit'];

/**
 * Ready when the database answers, has every migration, and really keeps what it acknowledges; the reason why not is
 * logged, and the caller learns only that it is not.
 */
export async function checkReady(em: EntityManager): Promise<Health> {
  const reason = await whyNotReady(em).catch((error: unknown) => String(error));
  if (reason === null) return { status: 'ok' };
  console.error(`not ready: ${reason}`);
  throw new ApiError('not-ready', 'The server is not ready yet.', { retryAfter: 5 });
}

async function whyNotReady(em: EntityManager): Promise<string | null> {
  const off: { name: string }[] = await em.execute(
    `select name from pg_settings where name in (${SAFE_SETTINGS.map(() => '?').join(', ')}) and setting = 'off'`,
    SAFE_SETTINGS,
  );
  if (off.length > 0) return `${off.map(({ name }) => name).join(', ')} is off`;
  const done: { name: string }[] = await em.execute('select name from schema_migrations');
  const names = new Set(done.map(({ name }) => name));
  const missing = ALL_MIGRATIONS.filter(({ name }) => !names.has(name));
  return missing.length > 0 ? `migrations are missing: ${missing.map(({ name }) => name).join(', ')}` : null;
}
