import 'server-only';
import { type EntityManager, MikroORM } from '@mikro-orm/postgresql';
import { ormOptions } from '@/mikro-orm.config';
import { serverEnv } from './env';

declare global {
  // Next loads this module more than once; the pool must be one.
  var spindleafOrm: Promise<MikroORM> | undefined;
}

/** The one connection pool of the process. The promise is kept, not its value, so that two first requests share it. */
export function database(): Promise<MikroORM> {
  globalThis.spindleafOrm ??= connect();
  return globalThis.spindleafOrm;
}

async function connect(): Promise<MikroORM> {
  try {
    return await MikroORM.init(ormOptions(serverEnv().databaseUrl));
  } catch (error) {
    globalThis.spindleafOrm = undefined;
    throw error;
  }
}

/** An entity manager of one's own, for one request: identity maps are never shared between requests. */
export async function entityManager(): Promise<EntityManager> {
  return (await database()).em.fork();
}
