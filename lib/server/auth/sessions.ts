import 'server-only';
import { randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { AccountSessions } from '@/lib/contracts/account';
import { Session } from '@/entities/session.entity';
import { notFound } from '../http/api-error';
import type { Principal } from './principal';
import { SESSION_IDLE_SECONDS, SESSION_SECONDS, type SessionClaim } from './session-cookie';

/** `lastSeenAt` is written at most this often, so that reading does not mean writing, seconds. */
const SEEN_EVERY_SECONDS = 300;

/** Opens a session for an account and gives its id. */
export async function openSession(em: EntityManager, userId: string, device: string): Promise<string> {
  const id = randomUUID();
  const now = new Date();
  await em.insert(Session, {
    id,
    user: userId,
    device: device.slice(0, 200),
    createdAt: now,
    lastSeenAt: now,
    expiresAt: later(now, SESSION_SECONDS),
  });
  return id;
}

/** Who `claim` is, if the session it names is open now; one query by primary key. */
export async function principalOf(em: EntityManager, claim: SessionClaim): Promise<Principal | null> {
  const now = new Date();
  const session = await em.findOne(
    Session,
    { id: claim.sessionId, user: claim.userId, ...openAt(now) },
    { populate: ['user'] },
  );
  if (!session) return null;
  if (later(session.lastSeenAt, SEEN_EVERY_SECONDS) < now) {
    await em.nativeUpdate(Session, { id: session.id }, { lastSeenAt: now });
  }
  const user = session.user.getEntity();
  return { userId: user.id, sessionId: session.id, name: user.name, email: user.email };
}

/** The account's open sessions, last seen first. */
export async function listSessions(em: EntityManager, principal: Principal): Promise<AccountSessions> {
  const sessions = await em.find(
    Session,
    { user: principal.userId, ...openAt(new Date()) },
    { orderBy: { lastSeenAt: 'desc', id: 'asc' }, limit: 200 },
  );
  const items = sessions.map((session) => ({
    id: session.id,
    device: session.device,
    createdAt: session.createdAt.toISOString(),
    lastSeenAt: session.lastSeenAt.toISOString(),
    expiresAt: session.expiresAt.toISOString(),
    current: session.id === principal.sessionId,
  }));
  return { items };
}

/** Ends one of the account's own sessions. */
export async function endSession(em: EntityManager, principal: Principal, sessionId: string): Promise<void> {
  const ended = await em.nativeUpdate(
    Session,
    { id: sessionId, user: principal.userId, revokedAt: null },
    { revokedAt: new Date() },
  );
  if (ended === 0) throw notFound('The session');
}

/** Ends every session of the account but `keep`. Holds from the next request on, everywhere. */
export async function endSessions(em: EntityManager, userId: string, keep?: string): Promise<void> {
  const others = keep === undefined ? {} : { id: { $ne: keep } };
  await em.nativeUpdate(Session, { user: userId, revokedAt: null, ...others }, { revokedAt: new Date() });
}

function openAt(now: Date) {
  return {
    revokedAt: null,
    expiresAt: { $gt: now },
    lastSeenAt: { $gt: later(now, -SESSION_IDLE_SECONDS) },
  };
}

function later(from: Date, seconds: number): Date {
  return new Date(from.getTime() + seconds * 1000);
}
