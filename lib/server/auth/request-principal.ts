import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { cookies } from 'next/headers';
import { entityManager } from '../database';
import type { Principal } from './principal';
import { cookieValue, readSessionCookie, sessionCookieName } from './session-cookie';
import { principalOf } from './sessions';

/** Who makes this request, or null. Asks the sessions table, so an ended session is nobody. */
export async function requestPrincipal(em: EntityManager, headers: Headers): Promise<Principal | null> {
  const claim = await readSessionCookie(cookieValue(headers.get('cookie'), sessionCookieName()));
  return claim && principalOf(em, claim);
}

/** {@link requestPrincipal} for pages and layouts. */
export async function pagePrincipal(): Promise<Principal | null> {
  const claim = await readSessionCookie((await cookies()).get(sessionCookieName())?.value);
  return claim && principalOf(await entityManager(), claim);
}
